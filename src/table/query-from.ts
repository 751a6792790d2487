import type { Endpoint, QueryInput } from '../../server/contract/endpoint';

type Asked = Endpoint & { query: NonNullable<Endpoint['query']> };

/** The filters of a list as its URL has them; one the contract does not know is left out rather than refused: links are typed and shortened by people. */
export function queryFrom<const E extends Asked>(endpoint: E, names: readonly (keyof QueryInput<E> & string)[], search: URLSearchParams): QueryInput<E> {
  const given = names.flatMap((name) => [[name, search.get(name)] as const]).filter(([, value]) => value);
  const wanted = Object.fromEntries(given);
  const parsed = endpoint.query.safeParse(wanted);
  const wrong = new Set(parsed.success ? [] : parsed.error.issues.map((issue) => String(issue.path[0])));
  // What is left has passed the endpoint's own schema, name by name.
  return Object.fromEntries(given.filter(([name]) => !wrong.has(name))) as QueryInput<E>;
}
