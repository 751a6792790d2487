import type { Services } from '../http/context';
import { every } from '../jobs/every';
import type { Running } from '../start';
import type { RawReading } from '../telemetry/readings-of';
import { historyWriter, setNextTrucks, writeDeliveries } from './history';
import { keep } from './kept';
import { putOffVisits } from './requests';
import { live, storesOf } from './simulation';
import { freshFor, troublesAt } from './troubles';
import type { Played } from './world';

const DAY = 86_400_000;
/** What was missed longer ago is written as history, as is all that the door would find too old. */
const DOOR_MS = 3 * DAY;
const KEPT_MS = 60 * DAY;
const PACK_READINGS = 400;

/** Brings the world up to now: trucks that came, trucks to come, every reading missed, and troubles of the day. */
export async function catchUp(services: Services, url: string, played: Played[]): Promise<void> {
  const now = services.now();
  for (const { memory, demo, fleet, scoped } of played) {
    if (now - memory.troubles.madeAt <= freshFor) continue;
    memory.troubles = troublesAt(now, demo, fleet, memory.troubles);
    putOffVisits(services, scoped);
  }
  await advance(services, url, played);
}

/** Keeps it going until the server stops: each sensor speaks at its own minute of the half hour. */
export function play(running: Running, url: string, played: Played[]): void {
  const { services, stop } = running;
  const job = every(5000, services.log, () => advance(services, url, played));
  running.stop = async () => {
    await job.stop();
    await stop();
  };
}

async function advance(services: Services, url: string, played: Played[]): Promise<void> {
  let moved = false;
  for (const one of played) moved = (await advanceOne(services, url, one)) || moved;
  if (moved) keep(services.config.dataDir, played);
}

/** What was lived is remembered only once it is written and the door has taken it; until then it is lived again alike. */
async function advanceOne({ db, newId, now: clock }: Services, url: string, { demo, key, scoped, fleet, memory }: Played): Promise<boolean> {
  const now = clock();
  const lives = fleet.map((freezer) => ({ freezer, serial: freezer.serial, ...live(freezer, memory, { from: memory.at[freezer.serial] ?? now, speakFrom: now - KEPT_MS, to: now }) }));
  const moved = lives.filter(({ serial, at }) => at > (memory.at[serial] ?? 0));
  const drops = moved.flatMap((lived) => lived.drops);
  const write = historyWriter(db, scoped);
  db.$client.transaction(() => {
    for (const { freezer, readings } of moved) {
      const old = readings.filter(({ at }) => at < now - DOOR_MS);
      if (old.length > 0) write(freezer, old);
    }
    writeDeliveries(scoped, newId, demo.lotPrefix, drops);
    setNextTrucks(scoped, newId, storesOf(scoped), memory.troubles.staged, now);
  })();
  const readings = moved.flatMap((lived) => lived.readings.filter(({ at }) => at >= now - DOOR_MS));
  for (let from = 0; from < readings.length; from += PACK_READINGS) await post(url, key, readings.slice(from, from + PACK_READINGS));
  for (const { serial, truth, at } of moved) {
    memory.truths[serial] = truth;
    memory.at[serial] = at;
  }
  return moved.length > 0;
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
