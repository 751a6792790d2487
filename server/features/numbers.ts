import { counters, type ProducerDb } from '../db';

/** The next number of this producer, without gaps: it is taken inside the transaction that uses it. */
export function nextNumber(db: ProducerDb, name: string, first: number): number {
  const value = (db.find(counters, name)?.value ?? first - 1) + 1;
  db.upsert(counters, { id: name, value }, { value });
  return value;
}
