import type { RouteObject } from 'react-router-dom';

export const sensorRoutes: RouteObject[] = [
  { path: 'sensors', lazy: async () => (await import('./unclaimed')).unclaimedPage },
  { path: 'sensors/readings', lazy: async () => (await import('./quarantined')).quarantinedPage },
  { path: 'sensors/keys', lazy: async () => (await import('./keys')).keysPage },
];
