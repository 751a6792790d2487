import { sql } from 'drizzle-orm';
import type { FreezerPage } from '../../contract/freezers';
import { celsiusToFahrenheit } from '../../domain/units';
import type { ProducerDb } from '../producer-db';
import { installs, readings, sensors } from '../schema';

const AIR_MS = 4 * 86_400_000;
const AIR_POINTS = 200;

/** Air of the last days from whichever sensors hung in the freezer then; of every stretch the warmest, so that no warm spell is thinned away. */
export function airOfFreezer(db: ProducerDb, freezerId: string, now: number): FreezerPage['air'] {
  const since = now - AIR_MS;
  const rows = db.view<{ at: number; airC: number }>(
    (producer) => sql`
    select r.at, max(r.air_c) as "airC"
    from ${installs} i
    join ${sensors} s on s.producer_id = ${producer} and s.id = i.sensor_id
    join ${readings} r on r.sensor_no = s.no and r.at > ${since} and r.at >= i."from" and r.at < coalesce(i."to", ${now + 1})
    where i.producer_id = ${producer} and i.freezer_id = ${freezerId} and coalesce(i."to", ${now}) > ${since}
      and r.at <= ${now} and r.air_c is not null
    group by cast((${now} - r.at) / ${AIR_MS / AIR_POINTS} as integer)
    order by r.at`,
  );
  return rows.map(({ at, airC }) => [at, celsiusToFahrenheit(airC)]);
}

/** Which sensors hung in it, the youngest first. */
export const sensorsOfFreezer = (db: ProducerDb, freezerId: string): FreezerPage['sensors'] =>
  db.view<FreezerPage['sensors'][number]>(
    (producer) => sql`
    select s.serial, i."from", i."to"
    from ${installs} i join ${sensors} s on s.producer_id = ${producer} and s.id = i.sensor_id
    where i.producer_id = ${producer} and i.freezer_id = ${freezerId}
    order by i."from" desc, i.id desc`,
  );
