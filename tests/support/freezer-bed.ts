import path from 'node:path';
import {
  accounts,
  districts,
  freezers,
  freezerStates,
  installs,
  lanes,
  migrateDatabase,
  models,
  openDatabase,
  producerDb,
  producers,
  products,
  quarantinedReadings,
  readings,
  sensors,
  stores,
  systemDb,
  type Database,
} from '../../server/db';
import { importReadings, type ImportCounts, type ReadingDoor } from '../../server/telemetry/import-readings';
import type { Sorted } from '../../server/telemetry/readings-of';

export interface FreezerBed {
  db: Database;
  door: ReadingDoor;
  producerId: string;
  serial: string;
  import: (sorted: Sorted) => ImportCounts;
  /** Everything the readings made, without ids that depend on the run. */
  dump: () => { readings: unknown[]; states: unknown[] };
  serials: () => string[];
  quarantine: () => { serial: string; reason: string }[];
}

const drizzle = path.resolve(import.meta.dirname, '../../drizzle');

/** A database in memory with one freezer of two lanes and a sensor of three probes, installed long ago. */
export function freezerWithSensor(): FreezerBed {
  const db = openDatabase(':memory:');
  migrateDatabase(db, drizzle);
  let count = 0;
  const newId = () => `01900000-0000-7000-8000-${String(++count).padStart(12, '0')}`;
  const door = { now: () => Date.UTC(2026, 5, 10), newId, nextSensorNo: systemDb(db).nextSensorNo };
  const producerId = newId();
  const serial = 'urn:dev:os:32473-bed';
  plant(db, producerId, serial, newId);
  const scoped = producerDb(db, producerId);
  return {
    db,
    door,
    producerId,
    serial,
    import: (sorted) => db.$client.transaction(() => importReadings(db, door, producerId, sorted))(),
    dump: () => ({
      readings: db.select().from(readings).orderBy(readings.sensorNo, readings.at).all(),
      states: scoped.select({ at: freezerStates.at, pounds: freezerStates.pounds, state: freezerStates.state }).from(freezerStates).all(),
    }),
    serials: () => scoped.select({ serial: sensors.serial }).from(sensors).all().map((row) => row.serial),
    quarantine: () => scoped.select({ serial: quarantinedReadings.serial, reason: quarantinedReadings.reason }).from(quarantinedReadings).all(),
  };
}

function plant(db: Database, producerId: string, serial: string, newId: () => string): void {
  const createdAt = 0;
  db.insert(producers).values({ id: producerId, slug: 'bed-ice', name: 'Bed Ice', timeZone: 'America/Chicago', language: 'en', urgentPhone: '', createdAt }).run();
  const scoped = producerDb(db, producerId);
  const [accountId, districtId, storeId, modelId, freezerId, sensorId] = [newId(), newId(), newId(), newId(), newId(), newId()] as const;
  scoped.insert(accounts, { id: accountId, number: '1', name: 'Bed', language: 'en', createdAt });
  scoped.insert(districts, { id: districtId, name: 'Bed', createdAt });
  scoped.insert(stores, {
    id: storeId,
    accountId,
    districtId,
    name: 'Bed',
    kind: 'convenience',
    street: '1 Bed Road',
    city: 'Bed',
    region: 'AR',
    postalCode: '00000',
    latitude: 36,
    longitude: -93,
    timeZone: 'America/Chicago',
    language: 'en',
    phone: '',
    openHours: [6, 22],
    receivingHours: [],
    deliveryDays: [],
    createdAt,
  });
  scoped.insert(models, { id: modelId, name: 'Bed', insideWidthIn: 58, insideDepthIn: 27, insideHeightIn: 48, doors: 2, ratedPounds: 900, defrost: 'auto', createdAt });
  scoped.insert(freezers, { id: freezerId, storeId, modelId, assetNumber: '1', name: 'Bed', placement: 'indoor', channelDropIn: 1.5, rackIn: 2, headroomIn: 3, createdAt });
  [7, 20].forEach((bagPounds, position) => {
    const productId = newId();
    scoped.insert(products, { id: productId, name: `${bagPounds} lb`, bagPounds, createdAt });
    scoped.insert(lanes, { id: newId(), freezerId, position, productId, widthShare: 0.5 });
  });
  scoped.insert(sensors, { id: sensorId, no: 1, serial, createdAt });
  scoped.insert(installs, { id: newId(), sensorId, freezerId, probesIn: [10, 29, 48], from: 0 });
}
