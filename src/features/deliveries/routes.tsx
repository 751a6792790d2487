import type { RouteObject } from 'react-router-dom';

export const deliveryRoutes: RouteObject[] = [
  { path: 'stores/:storeId/deliveries', lazy: async () => (await import('./deliveries')).deliveriesPage },
  { path: 'stores/:storeId/deliveries/new', lazy: async () => (await import('./record-delivery')).recordDeliveryPage },
  { path: 'stores/:storeId/next-truck', lazy: async () => (await import('./next-truck')).nextTruckPage },
];
