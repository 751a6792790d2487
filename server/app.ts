import compression from 'compression';
import express, { type Express } from 'express';
import helmet from 'helmet';
import { pinoHttp } from 'pino-http';
import { auditRoutes } from './features/audit/routes';
import { authRoutes } from './features/auth/routes';
import { magicLink } from './features/auth/magic-link';
import { deliveriesRoutes } from './features/deliveries/routes';
import { devRoutes, hasDevDoors } from './features/dev/routes';
import { freezersRoutes } from './features/freezers/routes';
import { meRoutes } from './features/me/routes';
import { peopleRoutes } from './features/people/routes';
import { requestsRoutes } from './features/requests/routes';
import { sensorsRoutes } from './features/sensors/routes';
import { storesRoutes } from './features/stores/routes';
import { systemRoutes } from './features/system/routes';
import { telemetryRoutes } from './features/telemetry/routes';
import type { Services } from './http/context';
import { refuseCrossSite } from './http/cross-site';
import { addressOf, limit } from './http/limits';
import { problem, problemHandler } from './http/problem';
import { mountRoutes, type Route } from './http/route';
import { sessionMiddleware } from './http/session';
import { serveClient } from './http/static';

/** Every route of the server; `tests/isolation` holds what is mounted against the contract. */
export const routesOf = (services: Services): Route[] => [
  ...systemRoutes,
  ...telemetryRoutes,
  ...authRoutes(magicLink(services)),
  ...meRoutes,
  ...storesRoutes,
  ...freezersRoutes,
  ...deliveriesRoutes,
  ...requestsRoutes,
  ...sensorsRoutes,
  ...auditRoutes,
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
  app.use(pinoHttp({ logger: log, genReqId: () => newId(), autoLogging: false }));
  app.use(securityHeaders(config.baseUrl.startsWith('https:')));
  app.use(compression());
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
  app.use(problemHandler(log));
  return app;
}

const securityHeaders = (https: boolean) =>
  helmet({
    contentSecurityPolicy: {
      directives: {
        defaultSrc: ["'none'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        imgSrc: ["'self'", 'blob:', 'data:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        manifestSrc: ["'self'"],
        formAction: ["'self'"],
        baseUri: ["'none'"],
        frameAncestors: ["'none'"],
        upgradeInsecureRequests: https ? [] : null,
      },
    },
    strictTransportSecurity: https,
    referrerPolicy: { policy: 'same-origin' },
  });
