import { createHash } from 'node:crypto';
import { and, eq, installs, isNull, producerDb, quarantinedReadings, readings, sensors, type Database, type ProducerDb } from '../db';
import { mergeReadings, type Quarantined, type RawReading, type Sorted } from './readings-of';
import { refreshState } from './refresh-state';

/** What writing readings needs besides the database. */
export interface ReadingDoor {
  now: () => number;
  newId: () => string;
  nextSensorNo: () => number;
}

/** In readings: new ones, known ones, and those not believed. */
export interface ImportCounts {
  accepted: number;
  duplicate: number;
  quarantined: number;
}

/**
 * Writes readings and the states they change; call it inside a transaction. The outcome depends on the set of readings
 * ever imported, never on their order or number.
 */
export function importReadings(db: Database, door: ReadingDoor, producerId: string, { readings: sorted, quarantined }: Sorted): ImportCounts {
  const scoped = producerDb(db, producerId);
  const changed = new Set<string>();
  let accepted = 0;
  for (const reading of sorted) {
    const sensor = sensorOf(scoped, door, reading.serial);
    if (!keepReading(db, sensor.no, reading)) continue;
    accepted += 1;
    changed.add(sensor.id);
  }
  for (const one of quarantined) keepAside(scoped, door.now(), one);
  for (const sensorId of changed) refreshFreezerOf(db, scoped, sensorId);
  return { accepted, duplicate: sorted.length - accepted, quarantined: distinct(quarantined) };
}

/** A reading with several faults is one reading. */
const distinct = (quarantined: Quarantined[]): number => new Set(quarantined.map(({ device, at }) => `${device} ${at}`)).size;

/** A serial not heard before becomes an unclaimed sensor of this producer, whoever else may own one of that name. */
function sensorOf(db: ProducerDb, door: ReadingDoor, serial: string): { id: string; no: number } {
  const known = db.select({ id: sensors.id, no: sensors.no }).from(sensors).where(eq(sensors.serial, serial)).get();
  if (known) return known;
  const sensor = { id: door.newId(), no: door.nextSensorNo() };
  db.insert(sensors, { ...sensor, serial, firstHeardAt: door.now(), createdAt: door.now() });
  return sensor;
}

/** Whether the reading said anything new. */
function keepReading(db: Database, sensorNo: number, reading: RawReading): boolean {
  const { at, probes, airC, supplyV, conflict } = reading;
  const row = { sensorNo, at, probes, airC, supplyV, conflict };
  if (db.insert(readings).values(row).onConflictDoNothing().run().changes === 1) return true;
  const here = and(eq(readings.sensorNo, sensorNo), eq(readings.at, at));
  const known = db.select().from(readings).where(here).get();
  if (!known) throw new Error('a reading is there and is not');
  const merged = mergeReadings(known, row);
  if (JSON.stringify(merged) === JSON.stringify(known)) return false;
  db.update(readings).set(merged).where(here).run();
  return true;
}

/** The id is made of what it says, so that a replay leaves it as it is. */
function keepAside(db: ProducerDb, receivedAt: number, { device, at, reason, records }: Quarantined): void {
  const body = JSON.stringify([...records].sort());
  const id = createHash('sha256').update(JSON.stringify([device, at, reason, body])).digest('hex').slice(0, 32);
  if (!db.find(quarantinedReadings, id)) {
    db.insert(quarantinedReadings, { id, serial: device.slice(0, 200), at, reason, body: body.slice(0, 2000), receivedAt });
  }
}

function refreshFreezerOf(db: Database, scoped: ProducerDb, sensorId: string): void {
  const install = scoped
    .select({ freezerId: installs.freezerId })
    .from(installs)
    .where(and(eq(installs.sensorId, sensorId), isNull(installs.to)))
    .get();
  if (install) refreshState(db, scoped, install.freezerId);
}
