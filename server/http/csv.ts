import { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import { setImmediate as turn } from 'node:timers/promises';
import { stringify } from 'csv-stringify/sync';
import type { Response } from 'express';

/**
 * Answers a table as a file that spreadsheets open as it is meant: no text of a person's becomes a formula there. Others
 * get their turn between the batches of a long one.
 */
export async function sendCsv(res: Response, name: string, batches: Iterable<string[][]>): Promise<void> {
  res.set('content-disposition', `attachment; filename="${name}"`).type('text/csv; charset=utf-8');
  try {
    await pipeline(Readable.from(textOf(batches)), res);
  } catch (error) {
    if (!hasLeft(error)) throw error;
  }
}

async function* textOf(batches: Iterable<string[][]>): AsyncGenerator<string> {
  yield '\ufeff';
  for (const rows of batches) {
    yield stringify(rows.map((row) => row.map(plain)), { escape_formulas: true, record_delimiter: 'windows' });
    await turn();
  }
}

/** What is below zero is a number and no formula. */
const plain = (cell: string): string | number => (/^-\d+(\.\d+)?$/.test(cell) ? Number(cell) : cell);

/** Whoever asked went away before the end. */
const hasLeft = (error: unknown): boolean => error instanceof Error && 'code' in error && error.code === 'ERR_STREAM_PREMATURE_CLOSE';
