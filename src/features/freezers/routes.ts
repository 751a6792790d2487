import type { RouteObject } from 'react-router-dom';

export const fleetRoutes: RouteObject[] = [{ path: 'freezers', lazy: async () => (await import('./fleet')).fleetPage }];
