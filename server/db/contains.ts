import { sql, type SQL, type SQLWrapper } from 'drizzle-orm';

/** Any of the texts contains the words as they were typed: `%` and `_` mean themselves. */
export function contains(words: string, ...texts: SQLWrapper[]): SQL {
  const pattern = `%${words.trim().replace(/[\\%_]/g, (sign) => `\\${sign}`)}%`;
  return sql`(${sql.join(texts.map((text) => sql`${text} like ${pattern} escape '\\'`), sql` or `)})`;
}
