import type { Services } from '../http/context';
import { every, type Job } from '../jobs/every';
import type { RawReading } from '../telemetry/readings-of';
import { setNextTrucks, writeDeliveries, writeReadings } from './history';
import { fleetOf, live, type Drop } from './simulation';
import { keepMemory, storesOf, type Played } from './world';

const DAY = 86_400_000;
/** Older than this is written as history; younger goes through the door like any reading. */
const DOOR_MS = DAY;
const PACK_READINGS = 400;

/** Brings the world up to now: trucks that came, trucks to come, and every reading missed since it was last played. */
export async function catchUp(services: Services, url: string, played: Played[]): Promise<void> {
  for (const one of played) await advance(services, url, one);
  keepMemory(services, played);
}

/** Keeps it going: each sensor speaks at its own minute of the half hour. */
export const play = (services: Services, url: string, played: Played[]): Job => every(5000, services.log, () => catchUp(services, url, played));

async function advance(services: Services, url: string, one: Played): Promise<void> {
  const { scoped, memory, demo, key } = one;
  const { db, newId } = services;
  const now = services.now();
  const fresh: RawReading[] = [];
  const drops: Drop[] = [];
  for (const freezer of fleetOf(scoped, memory.troubles)) {
    const from = memory.at[freezer.serial] ?? now;
    const lived = live(freezer, memory, from, now);
    const old = lived.readings.filter(({ at }) => at < now - DOOR_MS);
    if (old.length > 0) db.$client.transaction(() => writeReadings(db, scoped, freezer, old))();
    fresh.push(...lived.readings.filter(({ at }) => at >= now - DOOR_MS));
    drops.push(...lived.drops);
  }
  db.$client.transaction(() => {
    writeDeliveries(scoped, newId, demo.slug === 'kestrel-bend' ? 'KB' : 'PC', drops);
    setNextTrucks(services, scoped, storesOf(scoped), memory, now);
  })();
  for (let from = 0; from < fresh.length; from += PACK_READINGS) await post(url, key, fresh.slice(from, from + PACK_READINGS));
}

/** The real door: SenML over HTTP with the source's key. */
async function post(url: string, key: string, readings: RawReading[]): Promise<void> {
  const response = await fetch(`${url}/api/telemetry`, {
    method: 'POST',
    headers: { authorization: `Bearer ${key}`, 'content-type': 'application/senml+json' },
    body: JSON.stringify(readings.flatMap(senml)),
  });
  if (!response.ok) throw new Error(`the door answered ${response.status}: ${await response.text()}`);
}

function senml({ serial, at, probes, airC, supplyV }: RawReading): object[] {
  const records = [
    ...probes.flatMap((v, i) => (v === null ? [] : [{ n: `probe${i + 1}`, u: 'm', v }])),
    { n: 'air', u: 'Cel', v: airC },
    { n: 'supply', u: 'V', v: supplyV },
  ];
  return records.map((record, i) => (i === 0 ? { bn: `${serial}:`, bt: at / 1000, ...record } : record));
}
