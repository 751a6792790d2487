import type { RouteObject } from 'react-router-dom';

/** The list, and one request beside it. */
export const requestRoutes: RouteObject[] = [
  {
    path: 'requests',
    lazy: async () => (await import('./queue')).queue,
    children: [{ path: ':requestId', lazy: async () => (await import('./request-page')).requestPage }],
  },
];
