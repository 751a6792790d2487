import path from 'node:path';
import { readConfig } from './config';
import { openWorld } from './demo/world';
import { start, stopOnSignal } from './start';

/** `npm run dev`: the server alone, with the demo world in its data folder; Vite stands in front of it. */
const running = await start(readConfig('development', process.env), path.resolve(import.meta.dirname, '..'));
await openWorld(running.services, (what) => console.error(what));
running.services.log.info({ port: running.port }, 'server is up');
stopOnSignal(running);
