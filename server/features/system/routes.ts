import { api, endpoints } from '../../contract';
import { openApi } from '../../http/openapi';
import { problem } from '../../http/problem';
import { route } from '../../http/route';
import { hasDevDoors } from '../dev/routes';

export const systemRoutes = [
  route(api.system.health, ({ db }) => {
    try {
      db.$client.prepare('select 1').get();
    } catch {
      throw problem('storage-full');
    }
    return { ok: true };
  }),

  route(api.system.openapi, ({ config }, { res }) => {
    const mounted = endpoints.filter(({ access }) => access.kind !== 'dev' || hasDevDoors(config.mode));
    res.json(openApi(mounted, config.baseUrl));
    return undefined;
  }),
];
