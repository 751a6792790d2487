import type { RouteObject } from 'react-router-dom';
import { accountRoutes } from './features/accounts/routes';
import { comparisonRoutes } from './features/comparison/routes';
import { freezerPageRoutes } from './features/freezers/page-routes';
import { fleetRoutes } from './features/freezers/routes';
import { peopleRoutes } from './features/people/routes';
import { requestRoutes } from './features/requests/routes';
import { sensorRoutes } from './features/sensors/routes';
import { settingsRoutes } from './features/settings/routes';
import { storeFormRoutes } from './features/stores/form/routes';
import { storeRoutes } from './features/stores/routes';
import { truckRoutes } from './features/trucks/routes';
import { Failure, FailurePage, NotFound } from './layouts/failure';
import { FirstLook } from './layouts/first-look';
import { MemberLayout } from './layouts/member-layout';
import { Nobody } from './layouts/nobody';
import { Root } from './layouts/root';
import { atProducer, land, landAtProducer, signedIn } from './layouts/signed-in';

const publicRoutes: RouteObject = {
  lazy: async () => ({ Component: (await import('./layouts/public-layout')).PublicLayout }),
  children: [
    { path: 'sign-in', lazy: async () => ({ Component: (await import('./features/sign-in/sign-in')).SignIn }) },
    { path: 'sign-in/confirm', lazy: async () => ({ Component: (await import('./features/sign-in/confirm')).Confirm }) },
  ],
};

/** A page that fails inside a layout leaves the layout standing. */
const inside = (children: RouteObject[]): RouteObject[] => [
  { ErrorBoundary: Failure, children: [...children, { path: '*', Component: NotFound }] },
];

const producerRoutes: RouteObject[] = [
  { index: true, loader: landAtProducer },
  { path: 'stores', lazy: async () => (await import('./features/stores/stores-list')).storesList },
  ...requestRoutes,
  ...sensorRoutes,
  ...storeRoutes,
  ...storeFormRoutes,
  ...truckRoutes,
  ...peopleRoutes,
  ...accountRoutes,
  ...comparisonRoutes,
  ...fleetRoutes,
  ...freezerPageRoutes,
  ...settingsRoutes,
  { path: 'changes', lazy: async () => (await import('./features/audit/changes')).changesPage },
];

export const routes: RouteObject[] = [
  {
    Component: Root,
    HydrateFallback: FirstLook,
    ErrorBoundary: FailurePage,
    children: [
      publicRoutes,
      {
        loader: signedIn,
        Component: MemberLayout,
        ErrorBoundary: FailurePage,
        children: inside([
          { index: true, loader: land, Component: Nobody },
          { path: 'profile', lazy: async () => (await import('./features/profile/profile')).profile },
        ]),
      },
      { path: ':producer', loader: atProducer, Component: MemberLayout, ErrorBoundary: FailurePage, children: inside(producerRoutes) },
    ],
  },
];
