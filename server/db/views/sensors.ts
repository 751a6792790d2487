import { sql } from 'drizzle-orm';
import type { Result } from '../../contract/endpoint';
import type { findSensors } from '../../contract/sensors';
import type { QuarantineReason } from '../../contract/telemetry';
import { contains } from '../contains';
import type { ProducerDb } from '../producer-db';
import { freezers, installs, quarantinedReadings, readings, sensors, stores } from '../schema';

export interface UnclaimedRow {
  id: string;
  serial: string;
  firstHeardAt: number | null;
  lastReadingAt: number | null;
}

/** Sensors in no freezer now, by serial, from behind `after`. */
export const unclaimedSensors = (db: ProducerDb, after: string | null, limit: number): UnclaimedRow[] =>
  db.view<UnclaimedRow>(
    (producer) => sql`
    select s.id, s.serial, s.first_heard_at as "firstHeardAt",
      (select max(r.at) from ${readings} r where r.sensor_no = s.no) as "lastReadingAt"
    from ${sensors} s
    where s.producer_id = ${producer} and ${after === null ? sql`1` : sql`s.serial > ${after}`}
      and not exists (select 1 from ${installs} i where i.producer_id = ${producer} and i.sensor_id = s.id and i."to" is null)
    order by s.serial limit ${limit}`,
  );

type FoundSensor = Result<typeof findSensors>['sensors'][number];

/** Sensors whose serial contains the words, in whatever freezer, the unclaimed first. */
export function sensorsFound(db: ProducerDb, words: string, limit: number): FoundSensor[] {
  const rows = db.view<Omit<FoundSensor, 'freezer'> & { freezer: string | null }>(
    (producer) => sql`
    select ${sensors.id} as id, ${sensors.serial} as serial,
      (select max(r.at) from ${readings} r where r.sensor_no = ${sensors.no}) as "lastReadingAt",
      coalesce((select json_array_length(r.probes) from ${readings} r
        where r.sensor_no = ${sensors.no} order by r.at desc limit 1), 0) as probes,
      (select json_object('id', f.id, 'name', f.name, 'store', s.name)
        from ${installs} i
        join ${freezers} f on f.producer_id = ${producer} and f.id = i.freezer_id
        join ${stores} s on s.producer_id = ${producer} and s.id = f.store_id
        where i.producer_id = ${producer} and i.sensor_id = ${sensors.id} and i."to" is null limit 1) as freezer
    from ${sensors}
    where ${sensors.producerId} = ${producer} and ${contains(words, sensors.serial)}
    order by freezer is not null, ${sensors.serial} limit ${limit}`,
  );
  // Built by the statement above.
  return rows.map((row) => ({ ...row, freezer: row.freezer === null ? null : (JSON.parse(row.freezer) as FoundSensor['freezer']) }));
}

export interface QuarantinedRow {
  id: string;
  serial: string;
  at: number | null;
  reason: QuarantineReason;
  records: string[];
  receivedAt: number;
}

/** Readings that were not believed, youngest first, from behind `after`. */
export function quarantined(db: ProducerDb, after: readonly [receivedAt: number, id: string] | null, limit: number): QuarantinedRow[] {
  const rows = db.view<Omit<QuarantinedRow, 'records'> & { body: string }>(
    (producer) => sql`
    select q.id, q.serial, q.at, q.reason, q.body, q.received_at as "receivedAt"
    from ${quarantinedReadings} q
    where q.producer_id = ${producer} and ${after ? sql`(q.received_at, q.id) < (${after[0]}, ${after[1]})` : sql`1`}
    order by q.received_at desc, q.id desc limit ${limit}`,
  );
  return rows.map(({ body, ...row }) => ({ ...row, records: namesIn(body) }));
}

/** The body is a list of record names, which a very long one may have been cut off. */
function namesIn(body: string): string[] {
  try {
    const names: unknown = JSON.parse(body);
    return Array.isArray(names) ? names.map(String) : [];
  } catch {
    return [];
  }
}
