import type { RouteObject } from 'react-router-dom';

export const comparisonRoutes: RouteObject[] = [{ path: 'comparison', lazy: async () => (await import('./comparison')).comparisonPage }];
