import type { RouteObject } from 'react-router-dom';

export const truckRoutes: RouteObject[] = [{ path: 'trucks', lazy: async () => (await import('./trucks')).trucksPage }];
