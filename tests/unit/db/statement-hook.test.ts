import path from 'node:path';
import { describe, expect, test } from 'vitest';
import { migrateDatabase, openDatabase } from '../../../server/db';
import { acrossProducers, unscoped } from '../../../server/db/statement-hook';

const db = openDatabase(':memory:');
migrateDatabase(db, path.resolve('drizzle'));

describe('refused', () => {
  test.each([
    ['a select', 'select * from store'],
    ['a select by id', 'select * from "store" where "store"."id" = ?'],
    ['an alias', 'select s.name from store s where s.id = ?'],
    ['a join', 'select * from store s join freezer f on f.store_id = s.id where s.producer_id = ?'],
    ['a left join', 'select * from "store" left join "freezer" on "freezer"."store_id" = "store"."id" where "store"."producer_id" = ?'],
    ['a subquery', 'select (select count(*) from request r where r.store_id = s.id) from store s where s.producer_id = ?'],
    ['a subquery in a condition', 'select * from store s where s.producer_id = ? and exists (select 1 from freezer f where f.store_id = s.id)'],
    ['a subquery in from', 'select * from (select * from store) x'],
    ['a common table expression', 'with x as (select * from store) select * from x'],
    ['a union', 'select id from store where producer_id = ? union select id from freezer'],
    ['an insert', 'insert into "store" ("id", "name") values (?, ?)'],
    ['an insert or replace', 'insert or replace into store (id) values (?)'],
    ['an insert from a select', 'insert into store (id, producer_id) select id, ? from freezer'],
    ['an update', 'update "store" set "name" = ? where "store"."id" = ?'],
    ['an update or ignore', 'update or ignore store set name = ?'],
    ['a delete', 'delete from "store" where "store"."id" = ?'],
    ['a predicate only in a text', "select * from store where name = 'producer_id = 1'"],
    ['capital letters', 'SELECT * FROM store WHERE id = ?'],
    ['a capital name', 'select * from STORE where id = ?'],
    ['a list of tables', 'select * from store s, freezer f where s.producer_id = ?'],
    ['a schema before the name', 'select * from main.store where id = ?'],
    ['brackets around the name', 'select * from [store] where id = ?'],
    ['ticks around the name', 'select * from `store` where id = ?'],
    ['the table in brackets', 'select * from (store) where id = ?'],
    ['a predicate only in a comment', 'select * from store where id = ? -- producer_id = ?'],
    ['a predicate only in a long comment', 'select * from store /* producer_id = ? */ where id = ?'],
    ['a predicate that says nothing', 'select * from store where producer_id = producer_id'],
    ['a predicate undone', 'select * from store where producer_id = ? or 1'],
    ['what an update sets', 'update store set producer_id = ? where id = ?'],
  ])('%s', (_what, source) => {
    expect(unscoped(source)).not.toBeNull();
    expect(() => db.$client.prepare(source)).toThrow(/without its producer/);
  });
});

describe('let through', () => {
  test.each([
    ['a scoped select', 'select * from store where producer_id = ?'],
    ['a scoped join', 'select * from store s join freezer f on f.producer_id = s.producer_id and f.store_id = s.id where s.producer_id = ?'],
    ['an insert with its producer', 'insert into counter (id, producer_id, value) values (?, ?, 1)'],
    ['an update within', 'update store set name = ? where producer_id = ? and id = ?'],
    ['a list of producers', 'select * from store where producer_id in (?, ?)'],
    ['a listed table', 'select * from person where id = ?'],
  ])('%s', (_what, source) => {
    expect(() => db.$client.prepare(source)).not.toThrow();
  });

  test('what is said to reach across, and only while it does', () => {
    const all = 'select count(*) from lane';
    expect(() => acrossProducers('a test', () => db.$client.prepare(all))).not.toThrow();
    expect(() => db.$client.prepare(all)).toThrow(/without its producer/);
    expect(() =>
      acrossProducers('a test', () => {
        throw new Error('on purpose');
      }),
    ).toThrow('on purpose');
    expect(() => db.$client.prepare(all)).toThrow(/without its producer/);
  });
});
