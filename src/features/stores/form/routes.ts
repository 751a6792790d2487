import type { RouteObject } from 'react-router-dom';

export const storeFormRoutes: RouteObject[] = [
  { path: 'stores/new', lazy: async () => (await import('./new-store')).newStorePage },
  { path: 'stores/:storeId/change', lazy: async () => (await import('./change-store')).changeStorePage },
];
