import SQLite from 'better-sqlite3';
import { drizzle, type BetterSQLite3Database } from 'drizzle-orm/better-sqlite3';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import * as schema from './schema';
import { acrossProducers, watchStatements } from './statement-hook';

export type Connection = SQLite.Database;
export type Database = BetterSQLite3Database<typeof schema> & { $client: Connection };

/** Opens the file with the promises every connection keeps: durable before acknowledged, references enforced. */
export function openDatabase(file: string): Database {
  const connection = new SQLite(file);
  connection.pragma('journal_mode = WAL');
  connection.pragma('synchronous = FULL');
  connection.pragma('foreign_keys = ON');
  connection.pragma('recursive_triggers = ON');
  connection.pragma('busy_timeout = 5000');
  connection.pragma('cache_size = -65536');
  watchStatements(connection);
  return drizzle(connection, { schema, casing: 'snake_case' });
}

/** Foreign keys are off while migrating, since a table rebuilt inside the transaction would empty its children. */
export function migrateDatabase(db: Database, folder: string): void {
  db.$client.pragma('foreign_keys = OFF');
  acrossProducers('a migration speaks of tables, not of rows', () => migrate(db, { migrationsFolder: folder }));
  const broken = db.$client.pragma('foreign_key_check');
  if (Array.isArray(broken) && broken.length > 0) throw new Error(`${broken.length} references are broken after migration`);
  db.$client.pragma('foreign_keys = ON');
}
