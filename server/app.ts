import compression from 'compression';
import express, { type Express, type RequestHandler } from 'express';
import helmet from 'helmet';
import { accountsRoutes } from './features/accounts/routes';
import { auditRoutes } from './features/audit/routes';
import { authRoutes } from './features/auth/routes';
import { magicLink } from './features/auth/magic-link';
import { comparisonRoutes } from './features/comparison/routes';
import { deliveriesRoutes } from './features/deliveries/routes';
import { devRoutes, hasDevDoors } from './features/dev/routes';
import { districtsRoutes } from './features/districts/routes';
import { freezerPageRoutes } from './features/freezers/page-routes';
import { freezersRoutes } from './features/freezers/routes';
import { freezerSettingsRoutes } from './features/freezers/settings-routes';
import { meRoutes } from './features/me/routes';
import { peopleRoutes } from './features/people/routes';
import { productsRoutes } from './features/products/routes';
import { requestsRoutes } from './features/requests/routes';
import { sensorsRoutes } from './features/sensors/routes';
import { settingsRoutes } from './features/settings/routes';
import { storesRoutes } from './features/stores/routes';
import { storeSettingsRoutes } from './features/stores/settings-routes';
import { systemRoutes } from './features/system/routes';
import { telemetryRoutes } from './features/telemetry/routes';
import { trucksRoutes } from './features/trucks/routes';
import type { Services } from './http/context';
import { refuseCrossSite } from './http/cross-site';
import { addressOf, limit } from './http/limits';
import { problem, problemHandler } from './http/problem';
import { mountRoutes, type Route } from './http/route';
import { sessionMiddleware } from './http/session';
import { serveClient } from './http/static';

/** Every route of the server, the most asked first; `tests/isolation` holds what is mounted against the contract. */
export const routesOf = (services: Services): Route[] => [
  ...freezersRoutes,
  ...systemRoutes,
  ...telemetryRoutes,
  ...authRoutes(magicLink(services)),
  ...meRoutes,
  ...accountsRoutes,
  ...districtsRoutes,
  ...storesRoutes,
  ...storeSettingsRoutes,
  ...freezerPageRoutes,
  ...freezerSettingsRoutes,
  ...productsRoutes,
  ...deliveriesRoutes,
  ...trucksRoutes,
  ...comparisonRoutes,
  ...requestsRoutes,
  ...sensorsRoutes,
  ...auditRoutes,
  ...settingsRoutes,
  ...peopleRoutes,
  ...(hasDevDoors(services.config.mode) ? devRoutes : []),
];

/** Builds the server; never listens. `clientFolder` holds the built client. */
export function buildApp(services: Services, clientFolder: string): Express {
  const { config, db, now, log, newId, patience } = services;
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', config.trustProxy);
  app.set('query parser', 'simple');
  // Answers are not kept by browsers, so nobody asks whether they changed; files have their own.
  app.set('etag', false);
  app.use(securityHeaders(config.baseUrl.startsWith('https:')));
  app.use(compressed());
  app.use(['/api', '/dev'], refuseCrossSite(config.baseUrl), limit({ seconds: 60, most: 6000, key: addressOf }, hasDevDoors(config.mode) ? patience * 20 : patience));
  app.use(['/api', '/dev'], (_req, res, next) => {
    res.set('cache-control', 'no-store');
    next();
  });
  app.use(/^\/(?:api(?!\/telemetry)|dev)\b/, sessionMiddleware(config, db, now));
  app.use(/^\/api(?!\/telemetry)\b/, express.json({ limit: '100kb' }));
  mountRoutes(app, services, routesOf(services));
  app.use(serveClient(clientFolder));
  app.use((_req, _res, next) => next(problem('not-found')));
  app.use(problemHandler(log, newId));
  return app;
}

/** Whoever takes nothing compressed needs no look at what could be. */
function compressed(): RequestHandler {
  const compress = compression();
  return (req, res, next) => (req.headers['accept-encoding'] === undefined ? next() : compress(req, res, next));
}

/** What a page may load: nothing but our own, and no script or style inside a page. Said once, since it never changes. */
const POLICY = [
  "default-src 'none'",
  "script-src 'self'",
  "style-src 'self'",
  "img-src 'self' blob: data:",
  "font-src 'self'",
  "connect-src 'self'",
  "manifest-src 'self'",
  "form-action 'self'",
  "base-uri 'none'",
  "frame-ancestors 'none'",
];

function securityHeaders(https: boolean): RequestHandler[] {
  const policy = [...POLICY, ...(https ? ['upgrade-insecure-requests'] : [])].join(';');
  return [
    helmet({ contentSecurityPolicy: false, strictTransportSecurity: https, referrerPolicy: { policy: 'same-origin' } }),
    (_req, res, next) => {
      res.setHeader('content-security-policy', policy);
      next();
    },
  ];
}
