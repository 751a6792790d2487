import path from 'node:path';
import { beforeEach, expect, test } from 'vitest';
import { migrateDatabase, openDatabase, producerDb, type Database } from '../../../server/db';
import { lanes } from '../../../server/db/schema';
import { ownedTables, unownedTables } from '../../../server/db/statement-hook';
import { alder, alderPeople, birch, birchPeople } from '../../cast';
import { idOf, plantProducer } from '../../factories';
import { names, schemaFindings } from './schema-findings';

let db: Database;
beforeEach(() => {
  db = openDatabase(':memory:');
  migrateDatabase(db, path.resolve('drizzle'));
});

test('every table is owned with its producer in the key, every reference composite, or listed with a reason', () => {
  expect(schemaFindings(db.$client)).toEqual([]);
  expect(names(db.$client).length).toBeGreaterThan(25);
  for (const [table, reason] of Object.entries(unownedTables)) expect(reason.length, table).toBeGreaterThan(15);
});

test('the watch knows every owned table of the database', () => {
  expect([...ownedTables].sort()).toEqual(names(db.$client).filter((name) => !(name in unownedTables)).sort());
});

test.each([
  ['a table without a producer', 'create table leaf (id text primary key)', 'leaf has no producer'],
  ['a producer outside the key', 'create table leaf (id text primary key, producer_id text not null)', 'leaf has no producer in its key'],
  ['a producer that may be missing', 'create table leaf (id text, producer_id text, primary key (producer_id, id))', 'leaf may lack its producer'],
  [
    'a reference by id alone',
    'create table leaf (id text, producer_id text not null, store_id text references store(id), primary key (producer_id, id))',
    'leaf.store_id points to store without its producer',
  ],
])('%s would be found', (_what, statement, finding) => {
  db.$client.exec(statement);
  expect(schemaFindings(db.$client)).toContain(finding);
});

test('SQLite itself refuses a reference into another producer', () => {
  plantProducer(db, birch, birchPeople, 101);
  plantProducer(db, alder, alderPeople, 1);
  const own = producerDb(db, idOf(alder.slug, 'producer'));
  const lane = (freezer: string, position: number) => ({ id: idOf('new', `lane ${position}`), freezerId: freezer, position, productId: idOf('alder', 'small bag'), widthShare: 0.1 });
  expect(() => own.insert(lanes, lane(idOf('birch', 'lantern freezer'), 7))).toThrow(/FOREIGN KEY/);
  expect(() => own.insert(lanes, lane(idOf('alder', 'lantern freezer'), 8))).not.toThrow();
});

test('the audit trail cannot be rewritten', () => {
  plantProducer(db, alder, alderPeople, 1);
  expect(() => db.$client.exec("update audit_entry set act = 'x'")).toThrow(/append/i);
  expect(() => db.$client.exec('delete from audit_entry')).toThrow(/append/i);
});

test('the connection keeps its promises', () => {
  const pragma = (name: string): unknown => db.$client.pragma(name, { simple: true });
  expect(pragma('synchronous')).toBe(2);
  expect(pragma('foreign_keys')).toBe(1);
  expect(pragma('recursive_triggers')).toBe(1);
  expect(pragma('busy_timeout')).toBeGreaterThan(0);
});
