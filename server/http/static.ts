import { existsSync } from 'node:fs';
import path from 'node:path';
import express, { Router, type RequestHandler } from 'express';
import { problem } from './problem';

/** The built client: hashed assets for ever, the shell for every other path that is not the server's own. */
export function serveClient(folder: string): Router {
  const router = Router();
  const shell = path.join(folder, 'index.html');
  router.use('/assets', express.static(path.join(folder, 'assets'), { immutable: true, maxAge: '1y', fallthrough: false }));
  router.use(express.static(folder, { index: false, maxAge: '1h' }));
  router.get('/{*path}', sendShell(shell));
  return router;
}

const OURS = /^\/(api|dev|assets|healthz|metrics)(\/|$)/;

const sendShell =
  (shell: string): RequestHandler =>
  (req, res, next) => {
    if (OURS.test(req.path) || !existsSync(shell)) return next(problem('not-found'));
    res.sendFile(shell, { headers: { 'cache-control': 'no-cache' } });
  };
