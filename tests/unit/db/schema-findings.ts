import type { Connection } from '../../../server/db';
import { unownedTables } from '../../../server/db/statement-hook';

interface Column {
  name: string;
  pk: number;
  notnull: number;
}
interface Reference {
  id: number;
  seq: number;
  table: string;
  from: string;
  to: string;
}

/** Reads the database's own description of itself and says where a table could mix producers. */
export function schemaFindings(connection: Connection): string[] {
  const tables = names(connection).filter((name) => !(name in unownedTables));
  return [
    ...tables.flatMap((table) => keyFindings(connection, table)),
    ...names(connection).flatMap((table) => referenceFindings(connection, table)),
    ...Object.keys(unownedTables).filter((name) => !names(connection).includes(name)).map((name) => `${name} is listed and does not exist`),
  ];
}

export const names = (connection: Connection): string[] =>
  connection
    .prepare<[], { name: string }>("select name from sqlite_master where type = 'table' and name not like 'sqlite_%' and name not like '\\_\\_%' escape '\\'")
    .all()
    .map(({ name }) => name);

function keyFindings(connection: Connection, table: string): string[] {
  const columns = connection.prepare<[], Column>(`pragma table_info("${table}")`).all();
  const owner = columns.find(({ name }) => name === 'producer_id');
  if (!owner) return [`${table} has no producer`];
  return [...(owner.pk > 0 ? [] : [`${table} has no producer in its key`]), ...(owner.notnull ? [] : [`${table} may lack its producer`])];
}

/** A reference to an owned table must carry the producer on both sides. */
function referenceFindings(connection: Connection, table: string): string[] {
  const parts = connection.prepare<[], Reference>(`pragma foreign_key_list("${table}")`).all();
  const ids = [...new Set(parts.map(({ id }) => id))];
  return ids.flatMap((id) => {
    const columns = parts.filter((part) => part.id === id);
    const target = columns[0]?.table ?? '';
    // `reading` names a sensor by its number, which is unique in the installation.
    if (target in unownedTables || table === 'reading') return [];
    const composite = columns.some(({ from, to }) => from === 'producer_id' && to === 'producer_id');
    return composite ? [] : [`${table}.${columns.map(({ from }) => from).join()} points to ${target} without its producer`];
  });
}
