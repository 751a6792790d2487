import path from 'node:path';
import { beforeEach, expect, test } from 'vitest';
import { eq, migrateDatabase, openDatabase, producerDb, sql, type Database, type ProducerDb } from '../../../server/db';
import { counters, districts, freezers, people, stores } from '../../../server/db/schema';
import { alder, alderPeople, birch, birchPeople, twin, twinPeople } from '../../cast';
import { idOf, plantProducer } from '../../factories';

let db: Database;
let own: ProducerDb;
let theirs: ProducerDb;
beforeEach(() => {
  db = openDatabase(':memory:');
  migrateDatabase(db, path.resolve('drizzle'));
  plantProducer(db, twin, twinPeople, 201);
  plantProducer(db, birch, birchPeople, 101);
  plantProducer(db, alder, alderPeople, 1);
  own = producerDb(db, idOf(alder.slug, 'producer'));
  theirs = producerDb(db, idOf(birch.slug, 'producer'));
});

const foreign = idOf('birch', 'lantern');
const shared = idOf('alder', 'lantern');

test('a select sees its own rows, with a condition or without, and after an or', () => {
  const names = (condition?: ReturnType<typeof sql>) => own.select({ name: stores.name }).from(stores).where(condition).all().map(({ name }) => name);
  expect(own.select({ name: stores.name }).from(stores).all()).toHaveLength(4);
  expect(names()).toHaveLength(4);
  expect(names(sql`1 = 1 or 1 = 1`)).toHaveLength(4);
  expect(names(eq(stores.id, foreign))).toEqual([]);
  expect(names(eq(stores.id, shared))).toEqual([`lantern ${alder.mark}`]);
});

test('a join sees its own rows on both sides', () => {
  const rows = own.select({ store: stores.name, district: districts.name }).from(stores).innerJoin(districts, eq(districts.id, stores.districtId)).all();
  expect(rows).toHaveLength(4);
  expect(JSON.stringify(rows)).not.toContain(twin.mark);
  const either = own.select({ freezer: freezers.assetNumber }).from(stores).innerJoin(freezers, sql`1 = 0 or ${freezers.storeId} = ${stores.id}`).all();
  expect(either).toHaveLength(4);
  const left = own.select({ store: stores.name, freezer: freezers.assetNumber }).from(stores).leftJoin(freezers, eq(freezers.storeId, stores.id)).where(undefined).all();
  expect(left).toHaveLength(4);
  expect(JSON.stringify(left)).not.toContain(twin.mark);
});

test('joins that cannot be scoped are refused', () => {
  const query = () => own.select({ id: stores.id }).from(stores);
  expect(() => query().rightJoin(freezers, eq(freezers.storeId, stores.id))).toThrow(/cannot be scoped/);
  expect(() => query().fullJoin(freezers, eq(freezers.storeId, stores.id))).toThrow(/cannot be scoped/);
  expect(() => query().crossJoin(freezers)).toThrow(/cannot be scoped/);
  expect(() => query().innerJoin(people, sql`1`)).not.toThrow();
});

test('find answers its own row or nothing', () => {
  expect(own.find(stores, foreign)).toBeUndefined();
  expect(own.find(stores, shared)?.name).toContain(alder.mark);
  expect(own.find(stores, shared, sql`0`)).toBeUndefined();
  expect(own.find(stores, foreign, sql`1 or 1`)).toBeUndefined();
});

test('update and delete reach its own rows only', () => {
  expect(own.update(stores, foreign, { name: 'x' })).toBe(0);
  expect(own.update(stores, shared, { name: 'x' }, sql`1 or 1`)).toBe(1);
  expect(own.delete(counters, sql`1 or 1`)).toBe(1);
  expect(theirs.find(counters, 'request')?.value).toBe(1700);
  expect(theirs.find(stores, foreign)?.name).toContain(birch.mark);
  const kept = producerDb(db, idOf(twin.slug, 'producer'));
  expect(kept.find(stores, shared)?.name).toContain(twin.mark);
});

test('insert and upsert write for its own producer, whatever is smuggled in', () => {
  const smuggled = { id: 'visits', value: 1, producerId: idOf(birch.slug, 'producer') };
  own.insert(counters, smuggled);
  expect(theirs.find(counters, 'visits')).toBeUndefined();
  expect(own.find(counters, 'visits')?.value).toBe(1);
  own.upsert(counters, { id: 'request', value: 9 }, { value: 9 });
  expect(own.find(counters, 'request')?.value).toBe(9);
  expect(theirs.find(counters, 'request')?.value).toBe(1700);
});

test('a patch moves no row to another producer, whatever is smuggled in', () => {
  const smuggled = { value: 5, producerId: idOf(birch.slug, 'producer') };
  own.insert(counters, { id: 'visits', value: 1 });
  own.update(counters, 'visits', smuggled);
  own.upsert(counters, { id: 'visits', value: 6 }, smuggled);
  expect(theirs.find(counters, 'visits')).toBeUndefined();
  expect(own.find(counters, 'visits')?.value).toBe(5);
});

test('a hand-written view is held to its producer by the watch', () => {
  expect(() => own.view(() => sql`select * from ${stores}`)).toThrow(/without its producer/);
  expect(own.view((producer) => sql`select * from ${stores} where producer_id = ${producer}`)).toHaveLength(4);
});

test('the types refuse to name a producer', () => {
  const typed = (scoped: ProducerDb) => {
    // @ts-expect-error: an insert names no producer
    scoped.insert(counters, { id: 'a', value: 1, producerId: 'p' });
    // @ts-expect-error: nor does a patch
    scoped.update(counters, 'a', { producerId: 'p' });
    // @ts-expect-error: nor does it move a row to another id
    scoped.update(counters, 'a', { id: 'b' });
    // @ts-expect-error: nor what an upsert sets
    scoped.upsert(counters, { id: 'a', value: 1 }, { producerId: 'p' });
    // @ts-expect-error: a table without an owner is not read here
    scoped.find(people, 'a');
  };
  expect(typed).toBeTypeOf('function');
});
