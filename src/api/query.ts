import { QueryClient, queryOptions } from '@tanstack/react-query';
import type { Endpoint } from '../../server/contract/endpoint';
import { call, Problem, type Input } from './call';

export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      staleTime: 15_000,
      retry: (failures, error) => failures < 2 && error instanceof Problem && (error.type === 'offline' || error.status >= 502),
    },
  },
});

interface Refresh {
  /** Ask again every so many milliseconds while the page is looked at. */
  everyMs?: number;
}

/** The key and the fetcher of one question to the server: `[endpoint.id, input]`; the producer is one of the params. */
export const q = <const E extends Endpoint>(endpoint: E, input: Input<E>, { everyMs }: Refresh = {}) =>
  queryOptions({
    queryKey: [endpoint.id, input] as const,
    queryFn: ({ signal }) => call(endpoint, input, signal),
    refetchInterval: everyMs ?? false,
  });

/** Forget every answer of these endpoints, whatever was asked. */
export const invalidate = (...stale: Endpoint[]) =>
  Promise.all(stale.map((endpoint) => queryClient.invalidateQueries({ queryKey: [endpoint.id] })));
