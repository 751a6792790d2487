import type { RouteObject } from 'react-router-dom';

export const accountRoutes: RouteObject[] = [
  { path: 'accounts', lazy: async () => (await import('./accounts')).accountsPage },
  { path: 'accounts/new', lazy: async () => (await import('./new-account')).newAccountPage },
  { path: 'accounts/districts', lazy: async () => (await import('./districts')).districtsPage },
  { path: 'accounts/products', lazy: async () => (await import('../catalog/products')).productsPage },
  { path: 'accounts/models', lazy: async () => (await import('../catalog/models')).modelsPage },
  { path: 'accounts/:accountId', lazy: async () => (await import('./account')).accountPage },
  { path: 'accounts/:accountId/change', lazy: async () => (await import('./change-account')).changeAccountPage },
];
