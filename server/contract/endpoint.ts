import type * as z from 'zod/mini';
import type { Action, Subject } from './ability';
import type { ProblemType } from './problem';

/** Who may call an endpoint, and so what its handler is given. */
export type Access =
  /** Anybody; the reason says why that is safe. */
  | { kind: 'public'; reason: string }
  /** Any signed-in person, about themselves; `evenSeeing` is the way out for a session that sees as somebody else. */
  | { kind: 'person'; evenSeeing?: true }
  /** A member of the producer in the path whose rules allow this action on some such subject. */
  | { kind: 'may'; action: Action; subject: Subject }
  /** The holder of a telemetry key. */
  | { kind: 'telemetry-key' }
  /** Mounted in development and in the demo only, never under `npm start`. */
  | { kind: 'dev' };

type Shape = z.ZodMiniType;
/** What the answer is when it is not JSON by `result`: nothing (204) or a file. */
export type Answer = 'json' | 'nothing' | 'file';

export interface Endpoint<
  A extends Access = Access,
  P extends Shape = Shape,
  Q extends Shape = Shape,
  B extends Shape = Shape,
  R extends Shape = Shape,
> {
  id: string;
  method: 'get' | 'post' | 'put' | 'patch' | 'delete';
  /** In Express's form: `/api/:producer/stores/:storeId`. */
  path: string;
  access: A;
  params?: P;
  query?: Q;
  body?: B;
  /** Media type of the body; JSON unless said. */
  bodyType?: string;
  result?: R;
  /** Status of success; 200 with a result, 204 without, unless said. */
  status?: 200 | 201 | 202 | 204;
  answer?: Answer;
  problems: readonly ProblemType[];
}

export type Params<E> = E extends { params: infer S extends Shape } ? z.output<S> : Record<string, never>;
export type Query<E> = E extends { query: infer S extends Shape } ? z.output<S> : Record<string, never>;
export type Body<E> = E extends { body: infer S extends Shape } ? z.output<S> : undefined;
export type Result<E> = E extends { result: infer S extends Shape } ? z.output<S> : undefined;
/** What a caller sends: the same without the producer, which the client fills in. */
export type QueryInput<E> = E extends { query: infer S extends Shape } ? z.input<S> : Record<string, never>;
export type BodyInput<E> = E extends { body: infer S extends Shape } ? z.input<S> : undefined;

export const endpoint = <const E extends Endpoint>(definition: E): E => definition;
