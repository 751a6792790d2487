import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { abilityFor } from '../contract/ability';
import { isNull, producerDb, stores, type ProducerDb } from '../db';
import { newTelemetryKey } from '../features/telemetry/new-key';
import type { Services } from '../http/context';
import { runAction } from '../http/run-action';
import { createDemoProducer, historyDays } from './create';
import { demoProducers, type DemoProducer } from './data/producers';
import { setNextTrucks, writeDeliveries, writeReadings } from './history';
import { createRequests } from './requests';
import { fleetOf, live, type Memory } from './simulation';
import { trucksOf } from './trucks';

const HOUR = 3_600_000;
const DAY = 24 * HOUR;
const rawDays = 60;

/** One producer as it is played: its door's key, its data, and the truth behind its sensors. */
export interface Played {
  demo: DemoProducer;
  producerId: string;
  key: string;
  scoped: ProducerDb;
  memory: Memory;
}

interface Kept {
  producers: { slug: string; key: string; memory: Memory }[];
}

const fileOf = ({ config }: Services): string => path.join(config.dataDir, 'simulator.json');

/** The world as it stands, made first where it is missing. `progress` is told what is under way. */
export async function openWorld(services: Services, progress: (what: string) => void): Promise<Played[]> {
  const kept = existsSync(fileOf(services)) ? (JSON.parse(readFileSync(fileOf(services), 'utf8')) as Kept) : null;
  const played: Played[] = [];
  for (const demo of demoProducers) {
    const known = kept?.producers.find(({ slug }) => slug === demo.slug);
    const producer = services.system.producerBySlug(demo.slug);
    if (known && producer) {
      played.push({ demo, producerId: producer.id, key: known.key, memory: known.memory, scoped: producerDb(services.db, producer.id) });
    } else {
      progress(`making ${demo.name}`);
      played.push(await makeProducer(services, demo, progress));
    }
  }
  keepMemory(services, played);
  return played;
}

export function keepMemory(services: Services, played: Played[]): void {
  const kept: Kept = { producers: played.map(({ demo, key, memory }) => ({ slug: demo.slug, key, memory })) };
  writeFileSync(fileOf(services), JSON.stringify(kept), { mode: 0o600 });
}

async function makeProducer(services: Services, demo: DemoProducer, progress: (what: string) => void): Promise<Played> {
  const { db, newId, now } = services;
  const at = now();
  const producerId = db.$client.transaction(() => createDemoProducer(services, demo))();
  const scoped = producerDb(db, producerId);
  const memory: Memory = { at: {}, truths: {}, troubles: { broken: {}, silent: {}, waiting: {} } };
  makeTroubles(scoped, memory, at);
  const fleet = fleetOf(scoped, memory.troubles);
  progress(`${fleet.length} freezers live through ${historyDays} days`);
  const drops = fleet.flatMap((freezer) => {
    const { readings, drops: left } = live(freezer, memory, at - historyDays * DAY, at);
    db.$client.transaction(() => writeReadings(db, scoped, freezer, readings.filter((reading) => reading.at > at - rawDays * DAY)))();
    return left;
  });
  db.$client.transaction(() => {
    writeDeliveries(scoped, newId, demo.slug === 'kestrel-bend' ? 'KB' : 'PC', drops);
    setNextTrucks(services, scoped, storesOf(scoped), memory, at);
  })();
  await createRequests(services, scoped, demo.slug);
  return { demo, producerId, key: makeKey(services, producerId), scoped, memory };
}

export const storesOf = (scoped: ProducerDb) =>
  scoped.select({ id: stores.id, name: stores.name, timeZone: stores.timeZone, deliveryDays: stores.deliveryDays }).from(stores).where(isNull(stores.retiredAt)).all();

/** A dead compressor, a sensor that fell silent yesterday, and a truck that did not come. */
function makeTroubles(scoped: ProducerDb, { troubles }: Memory, now: number): void {
  const fleet = fleetOf(scoped, troubles);
  const at = (name: string) => fleet.find(({ store }) => store.name === name)?.serial;
  for (const name of ['Ozark Lane Grocery', 'La Gaviota 3']) {
    const serial = at(name);
    if (serial) troubles.broken[serial] = now - 4.5 * HOUR;
  }
  for (const name of ['Pelican Row Market', 'Abarrotes Mezquite']) {
    const serial = at(name);
    if (serial) troubles.silent[serial] = now - 19 * HOUR;
  }
  const waits = storesOf(scoped).find((store) => store.name === 'Marlow Bridge Mart' || store.name === 'Gasolinera Marea');
  const missed = waits && trucksOf(waits, now - 8 * DAY, now - 2 * HOUR).at(-1);
  if (waits && missed) troubles.waiting[waits.id] = missed.at;
}

function makeKey(services: Services, producerId: string): string {
  const at = services.now();
  const ability = abilityFor({ personId: '', membershipId: '', role: 'producer-admin', side: 'producer', storeIds: [], grants: [] });
  return runAction(services, { producerId, id: 'operator', ability }, 'create-telemetry-key', at, (tx) => newTelemetryKey(tx, services.newId(), 'demo sensors', at));
}

