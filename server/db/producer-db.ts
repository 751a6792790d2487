import { and, eq, sql, type SQL } from 'drizzle-orm';
import { getTableConfig, type SelectedFields, type SQLiteColumn, type SQLiteTable } from 'drizzle-orm/sqlite-core';
import type { Database } from './open';
import { unownedTables } from './statement-hook';

export type OwnedTable = SQLiteTable & { id: SQLiteColumn; producerId: SQLiteColumn };
type Without<T> = Omit<T, 'producerId'>;
type Inserted<T extends OwnedTable> = Without<T['$inferInsert']>;
type Patched<T extends OwnedTable> = Without<Partial<T['$inferInsert']>> & { id?: never };

/**
 * The only builder of the producer predicate: every read, join and write made here carries it.
 * A handler holds this and neither the database nor the producer's id.
 */
export function producerDb(db: Database, producerId: string) {
  const own = (table: OwnedTable): SQL => eq(table.producerId, producerId);

  return {
    /** A Drizzle select whose `from`, joins and `where` are scoped. */
    select: <F extends SelectedFields>(fields: F) => ({
      from: <T extends OwnedTable>(table: T) => scoped(db.select(fields).from(table), own(table), own),
    }),

    find: <T extends OwnedTable>(table: T, id: string, visible?: SQL): T['$inferSelect'] | undefined =>
      // Drizzle widens the row of a generic table; it is the table's own row.
      db.select().from(table as OwnedTable).where(and(own(table), eq(table.id, id), inside(visible))).get() as T['$inferSelect'] | undefined,

    insert: <T extends OwnedTable>(table: T, values: Inserted<T>): void => {
      db.insert(table as OwnedTable).values({ ...values, producerId }).run();
    },

    upsert: <T extends OwnedTable>(table: T, values: Inserted<T>, set: Patched<T>): void => {
      db.insert(table as OwnedTable)
        .values({ ...values, producerId })
        .onConflictDoUpdate({ target: [table.producerId, table.id], set: { ...set, producerId } as Record<string, unknown>, setWhere: own(table) })
        .run();
    },

    /** How many rows changed. */
    update: <T extends OwnedTable>(table: T, id: string, patch: Patched<T>, where?: SQL): number =>
      db.update(table as OwnedTable)
        .set({ ...patch, producerId } as Record<string, unknown>)
        .where(and(own(table), eq(table.id, id), inside(where)))
        .run().changes,

    delete: <T extends OwnedTable>(table: T, where: SQL): number =>
      db.delete(table).where(and(own(table), inside(where))).run().changes,

    /** Hand-written SQL of `views/`: it is given the producer to bind, and the statement hook refuses a table without it. */
    view: <Row>(build: (producer: string) => SQL): Row[] => db.all<Row>(build(producerId)),

    /** The same for a single column of texts: without an object for each row, a long list costs half. */
    texts: (build: (producer: string) => SQL): string[] => db.values<[string]>(build(producerId)).map(([text]) => text),
  };
}

export type ProducerDb = ReturnType<typeof producerDb>;

interface Select {
  where: (condition: SQL | undefined) => unknown;
  leftJoin: (table: SQLiteTable, on: SQL) => unknown;
  innerJoin: (table: SQLiteTable, on: SQL) => unknown;
}

/** Drizzle joins conditions as they are written, so an `or` of the caller's would reach past the producer. */
const inside = (condition: SQL | undefined): SQL | undefined => condition && sql`(${condition})`;

/** Keeps Drizzle's own types: the instance's `where` and joins are replaced by ones that add the predicate. */
function scoped<Q>(query: Q, predicate: SQL, own: (table: OwnedTable) => SQL): Q {
  const target = query as Q & Select;
  const where = target.where.bind(target);
  where(predicate);
  target.where = (condition) => where(and(predicate, inside(condition)));
  for (const join of ['leftJoin', 'innerJoin'] as const) {
    const plain = target[join].bind(target);
    target[join] = (table, on) => plain(table, isOwned(table) ? (and(own(table), inside(on)) as SQL) : on);
  }
  for (const join of ['rightJoin', 'fullJoin', 'crossJoin']) {
    Object.assign(target, { [join]: () => { throw new Error(`${join} cannot be scoped`); } });
  }
  return target;
}

/** Anything that is not a listed unowned table must have an owner; a subquery cannot be joined. */
function isOwned(table: SQLiteTable): table is OwnedTable {
  if (getTableConfig(table).name in unownedTables) return false;
  if (!('producerId' in table)) throw new Error('a joined table must be owned or listed');
  return true;
}
