import { rulesToAST } from '@casl/ability/extra';
import { and, eq, inArray, isNotNull, isNull, not, or, sql, type SQL } from 'drizzle-orm';
import type { SQLiteColumn } from 'drizzle-orm/sqlite-core';
import type { Ability, Action, Subject } from '../contract/ability';

export type Columns = Record<string, SQLiteColumn>;

/**
 * CASL's rules as SQL: which rows of a subject an action may touch. Null-safe (`$ne` and `$nin` hold for null, as in
 * CASL); no rule gives nothing; an operator or field that is not known throws, so that nothing is quietly allowed.
 */
export function allowed(ability: Ability, action: Action, type: Subject, columns: Columns): SQL {
  const ast = rulesToAST(ability, action, type);
  if (ast === null) return sql`0`;
  return condition(ast as Node, columns);
}

interface Node {
  operator: string;
  field?: string;
  value: unknown;
}

function condition(node: Node, columns: Columns): SQL {
  const make = operators[node.operator];
  if (!make) throw new Error(`rule operator ${node.operator} has no SQL`);
  return make(node, columns);
}

const TRUE = sql`1`;
const FALSE = sql`0`;
const parts = (node: Node, columns: Columns) => (node.value as Node[]).map((part) => condition(part, columns));

const operators: Record<string, (node: Node, columns: Columns) => SQL> = {
  and: (node, columns) => and(...parts(node, columns)) ?? TRUE,
  or: (node, columns) => or(...parts(node, columns)) ?? FALSE,
  // A condition is never null here, so its negation is exact.
  not: (node, columns) => not(and(...parts(node, columns)) ?? TRUE),
  eq: (node, columns) => equal(column(node, columns), known(node.value)),
  ne: (node, columns) => not(equal(column(node, columns), known(node.value))),
  in: (node, columns) => among(column(node, columns), node.value),
  nin: (node, columns) => not(among(column(node, columns), node.value)),
};

function column(node: Node, columns: Columns): SQLiteColumn {
  const found = node.field === undefined ? undefined : columns[node.field];
  if (!found) throw new Error(`rule field ${String(node.field)} has no column`);
  return found;
}

/** An undefined condition would match rows that lack the column: refused. */
function known(value: unknown): unknown {
  if (value === undefined) throw new Error('a rule compares with undefined');
  return value;
}

const equal = (field: SQLiteColumn, value: unknown): SQL =>
  value === null ? isNull(field) : (and(isNotNull(field), eq(field, value)) ?? FALSE);

function among(field: SQLiteColumn, value: unknown): SQL {
  if (!Array.isArray(value)) throw new Error('a rule’s list is not a list');
  const some = value.filter((item) => known(item) !== null);
  const listed = some.length === 0 ? FALSE : (and(isNotNull(field), inList(field, some)) ?? FALSE);
  return value.length > some.length ? (or(isNull(field), listed) ?? FALSE) : listed;
}

/** Long lists travel as one JSON value, so that the statement's text does not depend on their length. */
const inList = (field: SQLiteColumn, values: unknown[]): SQL =>
  values.every((value) => typeof value === 'string')
    ? sql`${field} in (select value from json_each(${JSON.stringify(values)}))`
    : inArray(field, values);

