import { writeFileSync } from 'node:fs';
import path from 'node:path';
import type { Language, Role } from '../contract/words';
import { demoPeople } from '../features/dev/demo-people';
import type { Services } from '../http/context';
import type { Played } from './world';

/** What the demo tells checks from outside, as `DATA_DIR/demo.json`. `producer` is a slug; `probes` is how many. */
export interface DemoFile {
  url: string;
  people: { role: Role; email: string; language: Language; producer: string; signInUrl: string }[];
  telemetry: { producer: string; key: string; sensors: { urn: string; freezerId: string; probes: number }[] }[];
}

export function demoFile({ db, config }: Services, played: Played[]): DemoFile {
  const url = config.baseUrl;
  return {
    url,
    people: demoPeople(db).map(({ role, email, language, slug }) => ({ role, email, language, producer: slug, signInUrl: signInUrl(url, email) })),
    telemetry: played.map(({ demo, key, fleet }) => ({
      producer: demo.slug,
      key,
      sensors: fleet.map(({ id, serial, simulated }) => ({ urn: serial, freezerId: id, probes: simulated.setup.mount.probesIn.length })),
    })),
  };
}

export const signInUrl = (url: string, email: string): string => `${url}/dev/people?email=${encodeURIComponent(email)}`;

/** Readable by its owner alone, for it holds the keys. */
export const writeDemoFile = (services: Services, played: Played[]): void =>
  writeFileSync(path.join(services.config.dataDir, 'demo.json'), `${JSON.stringify(demoFile(services, played), null, 2)}\n`, { mode: 0o600 });
