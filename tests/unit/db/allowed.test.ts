import { createMongoAbility, type RawRuleOf } from '@casl/ability';
import SQLite from 'better-sqlite3';
import { drizzle } from 'drizzle-orm/better-sqlite3';
import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import fc from 'fast-check';
import { expect, test } from 'vitest';
import { row, type Ability } from '../../../server/contract/ability';
import { allowed } from '../../../server/db/allowed';

const things = sqliteTable('thing', { id: integer().primaryKey(), storeId: text(), kind: text(), assigneeId: text(), weight: integer() });
const columns = { storeId: things.storeId, kind: things.kind, assigneeId: things.assigneeId, weight: things.weight };

const texts = [null, 'a', 'b', "o'c", ''];
const weights = [null, 0, 1, 2];
const connection = new SQLite(':memory:');
connection.exec('create table thing (id integer primary key, storeId text, kind text, assigneeId text, weight integer)');
const db = drizzle(connection);
const rows = texts.flatMap((storeId) => texts.slice(0, 3).flatMap((kind) => texts.slice(0, 3).flatMap((assigneeId) => weights.map((weight) => ({ storeId, kind, assigneeId, weight })))));
db.insert(things).values(rows).run();
const stored = db.select().from(things).all();

const bySql = (ability: Ability): number[] => db.select({ id: things.id }).from(things).where(allowed(ability, 'read', 'Request', columns)).all().map(({ id }) => id);
const byCasl = (ability: Ability): number[] => stored.filter((thing) => ability.can('read', row('Request', thing))).map(({ id }) => id);

const textValue = fc.constantFrom(...texts);
const weightValue = fc.constantFrom(...weights);
/** CASL reads `constructor`, so objects need their usual prototype. */
const plain = <T>(shape: { [K in keyof T]: fc.Arbitrary<T[K]> }) => fc.record(shape, { noNullPrototype: true });
const comparison = <T>(value: fc.Arbitrary<T>) =>
  fc.oneof(
    value,
    plain({ $eq: value }),
    plain({ $ne: value }),
    plain({ $in: fc.array(value, { maxLength: 4 }) }),
    plain({ $nin: fc.array(value, { maxLength: 4 }) }),
  );
/** Fields of one rule stand under and; rules of one set under or, or not. */
const fields = fc.record({ storeId: comparison(textValue), kind: comparison(textValue), assigneeId: comparison(textValue), weight: comparison(weightValue) }, { requiredKeys: [], noNullPrototype: true });
const rule = fc.record({
  action: fc.constantFrom('read' as const, 'read' as const, 'read' as const, 'update' as const),
  subject: fc.constantFrom('Request' as const, 'Request' as const, 'Request' as const, 'Store' as const),
  inverted: fc.constantFrom(false, false, true),
  conditions: fc.option(fields, { nil: undefined, freq: 15 }),
});
const ruleSets = fc.array(rule, { maxLength: 5 });

const abilityOf = (rules: RawRuleOf<Ability>[]): Ability => createMongoAbility<Ability>(rules);

test('5,000 random rule sets allow the same rows in SQL as in CASL', () => {
  let some = 0;
  fc.assert(
    fc.property(ruleSets, (rules) => {
      const ability = abilityOf(rules);
      const here = bySql(ability);
      if (here.length > 0 && here.length < stored.length) some += 1;
      expect(here).toEqual(byCasl(ability));
    }),
    { numRuns: 5000, seed: 20261201 },
  );
  // The sets must tell rows apart, or equality would say little.
  expect(some).toBeGreaterThan(1500);
});

test('no rule gives nothing, and neither does a rule of something else', () => {
  expect(bySql(abilityOf([]))).toEqual([]);
  expect(bySql(abilityOf([{ action: 'update', subject: 'Request' }]))).toEqual([]);
  expect(bySql(abilityOf([{ action: 'read', subject: 'Store' }]))).toEqual([]);
  expect(bySql(abilityOf([{ action: 'read', subject: 'Request', conditions: { storeId: { $in: [] } } }]))).toEqual([]);
});

test('a rule without conditions gives everything, until it is taken back', () => {
  const every = { action: 'read', subject: 'Request' } as const;
  expect(bySql(abilityOf([every]))).toHaveLength(stored.length);
  expect(bySql(abilityOf([every, { ...every, inverted: true }]))).toEqual([]);
});

test.each<[string, Record<string, unknown>]>([
  ['greater than', { weight: { $gt: 1 } }],
  ['a pattern', { storeId: { $regex: /a/ } }],
  ['existence', { storeId: { $exists: true } }],
  ['elements', { storeId: { $elemMatch: { id: 1 } } }],
  ['or, which rules say by being several', { $or: [{ storeId: 'a' }] }],
  ['a column nobody named', { colour: 'red' }],
  ['undefined', { storeId: undefined }],
  ['undefined in a list', { storeId: { $in: ['a', undefined] } }],
  ['not undefined', { storeId: { $ne: undefined } }],
  ['not among undefined', { storeId: { $nin: [undefined] } }],
])('%s throws rather than allow', (_what, given) => {
  expect(() => bySql(abilityOf([{ action: 'read', subject: 'Request', conditions: given }]))).toThrow();
});
