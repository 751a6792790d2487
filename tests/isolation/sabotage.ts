import SQLite from 'better-sqlite3';
import type { Database } from '../../server/db';

/** Rewrites statements on their way to SQLite, as if somebody had written them wrong. Counts how often. */
export function rewriteStatements(db: Database, rewrite: (source: string) => string): { times: number } {
  const connection = db.$client;
  const prepare = connection.prepare.bind(connection);
  const counted = { times: 0 };
  connection.prepare = (<T extends unknown[]>(source: string) => {
    const changed = rewrite(source);
    if (changed !== source) counted.times += 1;
    return prepare<T>(changed);
  }) as typeof connection.prepare;
  return counted;
}

/** Takes the watch over statements away, as if the database had been opened without it. */
export function withoutHook(db: Database): void {
  const bare = SQLite.prototype.prepare.bind(db.$client);
  db.$client.prepare = bare as typeof db.$client.prepare;
}

/** The producer's predicate of one table in one statement holds for everybody. */
export const forgetProducer = (statement: RegExp, column: string) => (source: string) =>
  statement.test(source) ? source.replaceAll(`${column} = ?`, `(${column} = ? or 1)`) : source;
