import multer from 'multer';
import { api } from '../../contract';
import { maxLogoBytes } from '../../contract/settings';
import { orNotFound } from '../../http/problem';
import { route } from '../../http/route';
import { requireSession } from '../../http/session';
import { changeSettings, clearLogo, presentSettings, setLogo } from './actions';

const takeLogo = multer({ storage: multer.memoryStorage(), limits: { fileSize: maxLogoBytes, files: 1, fields: 0, parts: 1 } }).single('logo');

export const settingsRoutes = [
  route(api.settings.read, (ctx) => presentSettings(ctx)),

  route(api.settings.change, (ctx, { body }) => {
    changeSettings(ctx, body);
    return presentSettings({ ...ctx, producer: ctx.readProducer() });
  }),

  route(
    api.settings.setLogo,
    async (ctx, { req }) => {
      await setLogo(ctx, req);
      return undefined;
    },
    (services) => [requireSession(services), takeLogo],
  ),

  route(api.settings.clearLogo, (ctx) => {
    clearLogo(ctx);
    return undefined;
  }),

  route(api.settings.readLogo, async ({ producer, storage }, { res }) => {
    const bytes = orNotFound(producer.logo === null ? null : await storage.get(producer.logo));
    res.set('cache-control', 'private, max-age=86400').type('image/png').send(bytes);
    return undefined;
  }),
];
