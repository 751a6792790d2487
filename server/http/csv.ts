import { once } from 'node:events';
import { setImmediate as turn } from 'node:timers/promises';
import { stringify } from 'csv-stringify/sync';
import type { Response } from 'express';

/**
 * Answers a table as a file that spreadsheets open as it is meant: no text of a person's becomes a formula there. Others
 * get their turn between the batches of a long one.
 */
export async function sendCsv(res: Response, name: string, batches: Iterable<string[][]>): Promise<void> {
  res.set('content-disposition', `attachment; filename="${name}"`).type('text/csv; charset=utf-8');
  res.write('\ufeff');
  for (const rows of batches) {
    if (res.closed) return;
    if (!res.write(stringify(rows, { escape_formulas: true, record_delimiter: 'windows' }))) await Promise.race([once(res, 'drain'), once(res, 'close')]);
    await turn();
  }
  res.end();
}
