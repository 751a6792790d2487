import type SQLite from 'better-sqlite3';
import { getTableConfig, SQLiteTable } from 'drizzle-orm/sqlite-core';
import * as schema from './schema';

/** Tables without an owner, each with the reason it may be read without one. */
export const unownedTables: Record<string, string> = {
  producer: 'the tenants themselves',
  person: 'one person may work with several producers',
  session: 'a session is a person’s, who then chooses the producer by the path',
  sign_in_link: 'asked for before anybody is known',
  reading: 'reached by the number of a sensor that a scoped query answered for',
  fleet_text: 'finds numbers of rows of fleet_row, which are then read with their producer',
  fleet_text_data: 'part of fleet_text',
  fleet_text_idx: 'part of fleet_text',
  fleet_text_docsize: 'part of fleet_text',
  fleet_text_config: 'part of fleet_text',
  outbox: 'sign-in mail belongs to a person; one job works through it and no route reads it',
  local_mail: 'exists in development and demo only',
};

export const ownedTables: ReadonlySet<string> = new Set(
  Object.values(schema)
    .filter((entry): entry is SQLiteTable & typeof entry => entry instanceof SQLiteTable)
    .map((table) => getTableConfig(table).name)
    .filter((name) => !(name in unownedTables)),
);

/** A table after from, join, into or update: quoted or not, with its schema or not, and after a comma in a list of them. */
const NAME = '(?:\\w+\\s*\\.\\s*)?["`[]?(\\w+)["`\\]]?';
const NAMED = new RegExp(`\\b(?:from|join|into|update)\\s*\\(*\\s*(?:or\\s+\\w+\\s+)?${NAME}`, 'g');
const LISTED = new RegExp(`\\bfrom\\s+${NAME}(?:\\s+(?:as\\s+)?\\w+)?\\s*,\\s*${NAME}`, 'g');
/** The producer bound to a value or to another table's producer; not to itself, and not in what an update sets. */
const SCOPE = /((?:["`[]?\w+["`\]]?\s*\.\s*)?["`[]?producer_id["`\]]?)\s*(?:=\s*(\?|[@:$]\w+|(?:["`[]?\w+["`\]]?\s*\.\s*)?["`[]?producer_id["`\]]?)|in\s*\()/g;
const INSERT = /\binto\s+["`[]?\w+["`\]]?\s*\([^)]*\bproducer_id\b/g;
const LITERAL = /'(?:[^']|'')*'/g;
const COMMENT = /--[^\n]*|\/\*[\s\S]*?\*\//g;
const SET = /\bset\b[\s\S]*?(?=\bwhere\b|\breturning\b|$)/g;
/** `… or 1` and the like beside a scope would undo it; a caller's conditions come in brackets. */
const UNDONE = /\bproducer_id["`\]]?\s*=\s*(?:\?|[@:$]\w+)\s+or\b/;
const seen = new Set<string>();
let across = 0;

/** Lets `work` touch tables of every producer; the reason is for the reader. Only `system-db.ts` and the demo's list of people do. */
export function acrossProducers<T>(_reason: string, work: () => T): T {
  across += 1;
  try {
    return work();
  } finally {
    across -= 1;
  }
}

/** How many texts are remembered: as looked at, and as prepared. */
const MOST_SEEN = 5000;
const MOST_PREPARED = 500;

/**
 * Refuses, at preparation, SQL that names a producer's table more often than it binds `producer_id`; what was prepared is
 * handed out again.
 */
export function watchStatements(connection: SQLite.Database): void {
  const prepare = keepingPrepared(connection.prepare.bind(connection));
  connection.prepare = (<T extends unknown[]>(source: string) => {
    if (across === 0 && !seen.has(source)) {
      const fault = unscoped(source);
      if (fault) throw new Error(`statement names ${fault} without its producer: ${source.slice(0, 200)}`);
      if (seen.size > MOST_SEEN) seen.clear();
      seen.add(source);
    }
    return prepare<T>(source);
  }) as typeof connection.prepare;
}

/** Statements by their text, until there are too many; one in the middle of being read is made anew. */
function keepingPrepared(prepare: SQLite.Database['prepare']) {
  const prepared = new Map<string, SQLite.Statement>();
  return <T extends unknown[]>(source: string): SQLite.Statement<T> => {
    const known = prepared.get(source);
    if (known && !known.busy) {
      // Who had it before may have asked for rows in another shape.
      if (known.reader) known.raw(false).pluck(false);
      return known as SQLite.Statement<T>;
    }
    if (prepared.size >= MOST_PREPARED) prepared.clear();
    const made = prepare<T>(source);
    prepared.set(source, made as SQLite.Statement);
    return made;
  };
}

/** The first producer's table that the statement names without a scope, or null. */
export function unscoped(source: string): string | null {
  const sql = source.replace(LITERAL, "''").replace(COMMENT, ' ').toLowerCase();
  const named = [...matches(sql, NAMED, 1), ...matches(sql, LISTED, 2)].filter((name) => ownedTables.has(name));
  if (named.length === 0) return null;
  const first = named[0] ?? null;
  if (UNDONE.test(sql)) return first;
  const isUpdate = /^\s*update\b/.test(sql);
  const asked = isUpdate ? sql.replace(SET, ' ') : sql.replace(/\bdo update set\b[\s\S]*?(?=\bwhere\b|\breturning\b|$)/g, ' ');
  const bound = [...asked.matchAll(SCOPE)].filter(([, left, right]) => left !== right).length;
  const scopes = bound + (sql.match(INSERT)?.length ?? 0);
  return scopes >= named.length ? null : (named[scopes] ?? first);
}

const matches = (sql: string, pattern: RegExp, group: number): string[] => [...sql.matchAll(pattern)].map((match) => match[group] ?? '');
