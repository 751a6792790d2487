import type { Express } from 'express';

interface Listed {
  path: string | RegExp;
  methods: string[] | undefined;
  router: Lister | undefined;
}
/** `router` 2.3 and later; Express's types do not know it yet. */
interface Lister {
  listRoutes: () => Listed[];
}

/** `get /api/me` and so on: what Express really answers, routers inside routers included. */
export function mountedRoutes(app: Express): string[] {
  const lister: unknown = app.router;
  if (!isLister(lister)) throw new Error('this router cannot list its routes');
  return walk(lister, '');
}

const isLister = (router: unknown): router is Lister => typeof router === 'function' && 'listRoutes' in router;

const walk = (lister: Lister, prefix: string): string[] =>
  lister.listRoutes().flatMap(({ path, methods, router }) => {
    const here = prefix + (path === '/' && router ? '' : String(path));
    return router ? walk(router, here) : (methods ?? ['all']).map((method) => `${method.toLowerCase()} ${here}`);
  });
