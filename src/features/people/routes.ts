import type { RouteObject } from 'react-router-dom';

export const peopleRoutes: RouteObject[] = [
  { path: 'people', lazy: async () => (await import('./people')).peoplePage },
  { path: 'people/invite', lazy: async () => (await import('./invite')).invitePage },
  { path: 'people/:memberId', lazy: async () => (await import('./change-person')).changePersonPage },
];
