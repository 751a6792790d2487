import path from 'node:path';
import { configOrLeave } from '../config';
import { roles } from '../contract/words';
import { demoPeople } from '../features/dev/demo-people';
import type { Services } from '../http/context';
import { start, stopOnSignal } from '../start';
import { signInUrl, writeDemoFile } from './demo-file';
import { catchUp, play } from './play';
import { openWorld, type Played } from './world';

/** `npm run demo`: the portal with the invented world in it, which goes on living unless `--no-play` is given. */
const running = await start(configOrLeave('demo'), path.resolve(import.meta.dirname, '../..'));
const { services } = running;
const local = `http://${services.config.host}:${running.port}`;

const began = Date.now();
const played = await openWorld(services, (what) => process.stderr.isTTY && process.stderr.write(`${what}\n`));
await catchUp(services, local, played);
writeDemoFile(services, played);
print(services, played, Date.now() - began);
if (!process.argv.includes('--no-play')) play(running, local, played);
stopOnSignal(running);

function print({ db, config }: Services, worlds: Played[], ms: number): void {
  const url = config.baseUrl;
  const people = demoPeople(db);
  console.log(`\nNilas is up at ${url}  (world ready in ${(ms / 1000).toFixed(1)} s; mail at ${url}/dev/mail, everybody at ${url}/dev/people)\n`);
  for (const { demo } of worlds) {
    console.log(demo.name);
    for (const role of roles) {
      const person = people.find((one) => one.role === role && one.slug === demo.slug);
      if (person) console.log(`  ${role.padEnd(15)} ${person.name.padEnd(18)} ${signInUrl(url, person.email)}`);
    }
  }
}
