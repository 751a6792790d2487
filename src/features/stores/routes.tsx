import type { RouteObject } from 'react-router-dom';
import { deliveryRoutes } from '../deliveries/routes';

/** One store's pages, under `/:producer`; each arrives with its own code. */
export const storeRoutes: RouteObject[] = [
  { path: 'stores/:storeId', lazy: async () => (await import('./store')).storePage },
  { path: 'stores/:storeId/report', lazy: async () => (await import('./report')).reportPage },
  { path: 'stores/:storeId/ask-for-ice', lazy: async () => (await import('./ask-for-ice')).askForIcePage },
  ...deliveryRoutes,
];
