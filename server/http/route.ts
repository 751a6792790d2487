import type { Request, RequestHandler, Response, Router } from 'express';
import type * as z from 'zod/mini';
import { abilityFor, type Ability } from '../contract/ability';
import type { Access, Body, Endpoint, Params, Query, Result } from '../contract/endpoint';
import type { FieldFault } from '../contract/problem';
import { producerDb, type Producer } from '../db';
import type { PersonContext, ProducerContext, Services } from './context';
import { MadeJson } from './made-json';
import { problem } from './problem';
import { runAction } from './run-action';
import { refuseWhileSeeing, seenBy, type Seen } from './seeing';
import { signedIn } from './session';

type ContextOf<A extends Access> = A['kind'] extends 'may' ? ProducerContext : A['kind'] extends 'person' ? PersonContext : Services;

export interface Incoming<E> {
  params: Params<E>;
  query: Query<E>;
  body: Body<E>;
  req: Request;
  res: Response;
}

type Handler<E extends Endpoint> = (ctx: ContextOf<E['access']>, incoming: Incoming<E>) => Result<E> | MadeJson | Promise<Result<E>>;

/** What must happen before the body is looked at: keys, limits, other media types. */
type Before = (services: Services) => RequestHandler[];

/** An endpoint with what answers it; `before` parses what is not JSON. */
export interface Route {
  endpoint: Endpoint;
  before: Before;
  handle: (services: Services, req: Request, res: Response) => Promise<void>;
}

export function route<const E extends Endpoint>(endpoint: E, handler: Handler<E>, before: Before = () => []): Route {
  return {
    endpoint,
    before,
    handle: async (services, req, res) => {
      // The context's type follows the endpoint's access, which `contextFor` reads at run time.
      const ctx = contextFor(services, endpoint, req) as ContextOf<E['access']>;
      const params = parseParams(endpoint, req);
      const query = parse(endpoint.query, queryOf(req), '/query');
      const body = endpoint.body && endpoint.access.kind !== 'telemetry-key' ? parse(endpoint.body, req.body, '') : req.body;
      const incoming = { params, query, body, req, res } as Incoming<E>;
      send(services, endpoint, res, await handler(ctx, incoming));
    },
  };
}

export function mountRoutes(router: Router, services: Services, routes: Route[]): void {
  for (const { endpoint, before, handle } of routes) {
    router[endpoint.method](endpoint.path, ...before(services), (req, res) => handle(services, req, res));
  }
}

function contextFor(services: Services, endpoint: Endpoint, req: Request): ProducerContext | PersonContext | Services {
  const { access } = endpoint;
  if (access.kind !== 'may' && access.kind !== 'person') return services;
  const { personId, handle } = signedIn(services, req);
  const seen = seenBy(services, req);
  refuseWhileSeeing(endpoint, seen);
  if (access.kind === 'person') {
    return { system: services.system, personId: seen?.membership.personId ?? personId, seen, sessionHandle: handle, now: services.now() };
  }
  const ctx = producerContext(services, personId, seen, String(req.params.producer));
  if (!ctx.ability.can(access.action, access.subject)) throw problem('not-allowed');
  return ctx;
}

/** The session proves a membership of the producer in the path; a stranger cannot tell a producer from nothing. */
function producerContext(services: Services, personId: string, seen: Seen | null, slug: string): ProducerContext {
  const { system, newId, newSecret, storage, config, db } = services;
  const found = seen ?? system.membershipAt(personId, slug);
  if (found?.producer.slug !== slug) throw problem('not-found');
  const now = services.now();
  const { producer, membership } = found;
  const viewer = system.viewerOf(membership, now);
  const ability: Ability = abilityFor(viewer);
  const actor = { producerId: producer.id, id: membership.id, ability };
  return {
    db: producerDb(db, producer.id),
    viewer,
    ability,
    producer: shown(producer),
    readProducer: () => shown(system.producerById(producer.id) ?? producer),
    get language() {
      return system.activePerson(viewer.personId)?.language ?? producer.language;
    },
    now,
    newId,
    newSecret,
    storage,
    baseUrl: config.baseUrl,
    act: (act, work) => runAction(services, actor, act, now, work),
  };
}

/** Without its id, which a handler must not hold. */
const shown = ({ id: _id, createdAt: _createdAt, ...producer }: Producer) => producer;

/** A malformed name in the path is a place that does not exist. */
function parseParams(endpoint: Endpoint, req: Request): unknown {
  if (!endpoint.params) return {};
  const parsed = endpoint.params.safeParse(req.params);
  if (!parsed.success) throw problem('not-found');
  return parsed.data;
}

const queryOf = (req: Request): unknown => ({ ...req.query });

function parse(schema: z.ZodMiniType | undefined, value: unknown, at: string): unknown {
  if (!schema) return {};
  const parsed = schema.safeParse(value);
  if (!parsed.success) throw problem('bad-input', undefined, parsed.error.issues.flatMap((issue) => faultOf(issue, at)));
  return parsed.data;
}

function faultOf(issue: z.core.$ZodIssue, at: string): FieldFault[] {
  const pointer = [at, ...issue.path.map(escaped)].join('/');
  if (issue.code === 'unrecognized_keys') return issue.keys.map((key) => ({ pointer: `${pointer}/${escaped(key)}`, fault: 'unknown-field' }));
  if (issue.code === 'too_big') return [{ pointer, fault: known(issue.message), params: { most: Number(issue.maximum) } }];
  if (issue.code === 'too_small') return [{ pointer, fault: known(issue.message), params: { least: Number(issue.minimum) } }];
  return [{ pointer, fault: known(issue.message) }];
}

/** A step of a JSON pointer (RFC 6901 section 3). */
const escaped = (key: PropertyKey): string => String(key).replace(/~/g, '~0').replace(/\//g, '~1');

/** Faults written in the contract are keys; the library's own English never leaves the server. */
const known = (message: string): string => (/^[a-z][a-z-]*$/.test(message) ? message : 'invalid');

/** Only what the contract promises leaves the server; what was made as JSON is held against it outside production. */
function send({ config }: Services, endpoint: Endpoint, res: Response, result: unknown): void {
  if (endpoint.answer === 'file' || res.headersSent) return;
  const status = endpoint.status ?? (endpoint.result ? 200 : 204);
  if (result instanceof MadeJson) {
    if (config.mode !== 'production') endpoint.result?.parse(JSON.parse(result.text));
    res.status(status).setHeader('content-type', 'application/json; charset=utf-8').end(result.text);
    return;
  }
  if (endpoint.result) res.status(status).json(endpoint.result.parse(result));
  else res.status(status).end();
}
