import path from 'node:path';
import { configOrLeave } from './config';
import { start, stopOnSignal } from './start';

/** `npm start`: the portal in earnest. The bundle stands in `dist/server`, two below the project. */
const running = await start(configOrLeave('production'), path.resolve(import.meta.dirname, '../..'));
running.services.log.info({ port: running.port, url: running.services.config.baseUrl }, 'nilas is up');
stopOnSignal(running);
