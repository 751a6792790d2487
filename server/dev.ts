import path from 'node:path';
import { configOrLeave } from './config';
import { catchUp, play } from './demo/play';
import { openWorld } from './demo/world';
import { start, stopOnSignal } from './start';

/** `npm run dev`: the server alone, with the demo world alive in its data folder; Vite stands in front of it. */
const running = await start(configOrLeave('development'), path.resolve(import.meta.dirname, '..'));
const { services, port } = running;
const local = `http://${services.config.host}:${port}`;
const played = await openWorld(services, (what) => console.error(what));
await catchUp(services, local, played);
play(running, local, played);
services.log.info({ port }, 'server is up');
stopOnSignal(running);
