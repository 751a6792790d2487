import path from 'node:path';
import { readConfig } from './config';
import { start, stopOnSignal } from './start';

/** `npm start`: the portal in earnest. The bundle stands in `dist/server`, two below the project. */
const running = await start(readConfig('production', process.env), path.resolve(import.meta.dirname, '../..'));
running.services.log.info({ port: running.port, url: running.services.config.baseUrl }, 'nilas is up');
stopOnSignal(running);
