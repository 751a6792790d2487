import { abilityFor } from '../contract/ability';
import { fillFleetRows, freezerStates, producerDb, type ProducerDb } from '../db';
import { newTelemetryKey } from '../features/telemetry/new-key';
import type { Services } from '../http/context';
import { runAction } from '../http/run-action';
import { createDemoProducer, historyDays } from './create';
import { demoProducers, type DemoProducer } from './data/producers';
import { historyWriter, setNextTrucks, writeDeliveries } from './history';
import { createRequests, keepPictures } from './requests';
import { createStrays } from './strays';
import { keep, kept } from './kept';
import { fleetOf, live, newMemory, storesOf, type FleetFreezer, type Memory } from './simulation';
import { noTroubles, troublesAt } from './troubles';

const DAY = 86_400_000;
const rawDays = 60;

/** One producer as it is played: its door's key, its data, its freezers, and the truth behind their sensors. */
export interface Played {
  demo: DemoProducer;
  key: string;
  scoped: ProducerDb;
  fleet: FleetFreezer[];
  memory: Memory;
}

/** The world as it stands, made first where it is missing. `progress` is told what is under way. */
export async function openWorld(services: Services, progress: (what: string) => void): Promise<Played[]> {
  const known = kept(services.config.dataDir);
  const played: Played[] = [];
  for (const demo of demoProducers) {
    const producer = services.system.producerBySlug(demo.slug);
    if (!producer) progress(`making ${demo.name}`);
    played.push(producer ? reopened(services, demo, producer.id, known.get(demo.slug)) : await makeProducer(services, demo, progress));
  }
  keep(services.config.dataDir, played);
  return played;
}

/** Without what was kept, the truth is taken from the levels as last known, under a new key. */
function reopened(services: Services, demo: DemoProducer, producerId: string, known: { key: string; memory: Memory } | undefined): Played {
  const scoped = producerDb(services.db, producerId);
  const fleet = fleetOf(scoped, demo.troubles.hungry);
  const memory = known?.memory ?? recalled(scoped, fleet, services.now());
  return { demo, key: known?.key ?? makeKey(services, producerId, demo), scoped, fleet, memory };
}

function recalled(scoped: ProducerDb, fleet: FleetFreezer[], now: number): Memory {
  const memory = newMemory();
  for (const { id, serial, simulated } of fleet) {
    const found = scoped.find(freezerStates, id);
    memory.at[serial] = found?.at ?? now;
    if (!found) continue;
    const pounds = simulated.setup.lanes.map(({ bagPounds }, lane) => (found.state.level.lanes[lane]?.bags ?? 0) * bagPounds);
    memory.truths[serial] = { pounds, tops: simulated.setup.mount.probesIn.map(() => 0) };
  }
  return memory;
}

/** In one transaction, so that a demo stopped while it is made is made anew. */
export async function makeProducer(services: Services, demo: DemoProducer, progress: (what: string) => void = () => {}): Promise<Played> {
  const pictures = await keepPictures(services, demo.slug);
  return services.db.$client.transaction(() => {
    const producerId = createDemoProducer(services, demo);
    const scoped = producerDb(services.db, producerId);
    const fleet = fleetOf(scoped, demo.troubles.hungry);
    progress(`${fleet.length} freezers live through ${historyDays} days`);
    const memory = liveThrough(services, demo, scoped, fleet);
    createRequests(services, scoped, demo.slug, pictures);
    createStrays(services, demo, producerId);
    return { demo, key: makeKey(services, producerId, demo), scoped, fleet, memory };
  })();
}

function liveThrough({ db, newId, now }: Services, demo: DemoProducer, scoped: ProducerDb, fleet: FleetFreezer[]): Memory {
  const at = now();
  const memory: Memory = { ...newMemory(), troubles: troublesAt(at, demo, fleet, noTroubles) };
  const write = historyWriter(db, scoped);
  const drops = fleet.flatMap((freezer) => {
    const lived = live(freezer, memory, { from: at - historyDays * DAY, speakFrom: at - rawDays * DAY, to: at });
    write(freezer, lived.readings);
    memory.truths[freezer.serial] = lived.truth;
    memory.at[freezer.serial] = lived.at;
    return lived.drops;
  });
  writeDeliveries(scoped, newId, demo.lotPrefix, drops);
  setNextTrucks(scoped, newId, storesOf(scoped), memory.troubles.staged, at);
  fillFleetRows(scoped);
  return memory;
}

const keyNames = { en: 'Demo sensors', es: 'Sensores de demostración' };

function makeKey(services: Services, producerId: string, { language }: DemoProducer): string {
  const at = services.now();
  const ability = abilityFor({ personId: '', membershipId: '', role: 'producer-admin', side: 'producer', storeIds: [], grants: [] });
  return runAction(services, { producerId, id: 'operator', ability }, 'create-telemetry-key', at, (tx) => newTelemetryKey(tx, { id: services.newId(), key: services.newSecret(), name: keyNames[language], now: at }));
}
