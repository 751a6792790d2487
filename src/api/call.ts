import type { Body, BodyInput, Endpoint, Params, QueryInput, Result } from '../../server/contract/endpoint';
import { problemTypeOf, type FieldFault, type ProblemDocument, type ProblemType } from '../../server/contract/problem';

/** What the server refused, or `offline` when it could not be reached. */
export class Problem extends Error {
  constructor(
    readonly type: ProblemType | 'offline',
    readonly status: number,
    readonly params: Record<string, string | number> = {},
    readonly errors: FieldFault[] = [],
    readonly requestId?: string,
  ) {
    super(type);
  }
}

type Given<Key extends string, T> = T extends undefined | Record<string, never> ? unknown : Record<Key, T>;
export type Input<E> = Given<'params', Params<E>> &
  (E extends { query: unknown } ? { query?: QueryInput<E> } : unknown) &
  Given<'body', BodyInput<E>> & { files?: FormData };

interface LooseInput {
  params?: Record<string, unknown>;
  query?: Record<string, unknown>;
  body?: unknown;
  files?: FormData;
}

/** Asks the server one endpoint of the contract; throws a `Problem` when it says no. */
export async function call<const E extends Endpoint>(endpoint: E, input: Input<E>, signal?: AbortSignal): Promise<Result<E>> {
  const { params = {}, query = {}, body, files }: LooseInput = input;
  const response = await reach(urlOf(endpoint, params, query), {
    method: endpoint.method.toUpperCase(),
    headers: body === undefined ? {} : { 'content-type': 'application/json' },
    body: files ?? (body === undefined ? undefined : JSON.stringify(body)),
    credentials: 'same-origin',
    signal,
  });
  if (!response.ok) throw await problemOf(response);
  // The server parses its answers against the same schema in tests and development.
  return (response.status === 204 || response.status === 202 ? undefined : await response.json()) as Result<E>;
}

export function urlOf(endpoint: Endpoint, params: Record<string, unknown>, query: Record<string, unknown> = {}): string {
  const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(params[name])));
  const search = new URLSearchParams();
  for (const [key, value] of Object.entries(query)) if (value !== undefined && value !== '') search.set(key, String(value));
  return search.size > 0 ? `${path}?${search}` : path;
}

async function reach(url: string, init: RequestInit): Promise<Response> {
  try {
    return await fetch(url, init);
  } catch (error) {
    if (init.signal?.aborted) throw error;
    throw new Problem('offline', 0);
  }
}

async function problemOf(response: Response): Promise<Problem> {
  try {
    const document = (await response.json()) as ProblemDocument;
    return new Problem(problemTypeOf(document), response.status, document.params, document.errors, document.requestId);
  } catch {
    return new Problem('server-error', response.status);
  }
}

export type { Body, Params, Result };
