import type { RouteObject } from 'react-router-dom';

/** One freezer's pages, under `/:producer`. */
export const freezerPageRoutes: RouteObject[] = [
  { path: 'freezers/:freezerId', lazy: async () => (await import('./page/freezer-page')).freezerPage },
  { path: 'freezers/:freezerId/change', lazy: async () => (await import('./form/change-freezer')).changeFreezerPage },
  { path: 'freezers/:freezerId/sensor', lazy: async () => (await import('./sensor/tie-sensor')).tieSensorPage },
  { path: 'stores/:storeId/freezers/new', lazy: async () => (await import('./form/new-freezer')).newFreezerPage },
];
