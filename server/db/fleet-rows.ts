import { sql, type SQL } from 'drizzle-orm';
import type { FleetRow } from '../contract/fleet';
import { searchText } from '../domain/folded-words';
import { riskAt } from '../domain/risk';
import type { ProducerDb } from './producer-db';
import { accounts, fleetRows, freezers, freezerStates, installs, lanes, nextTrucks, producers, products, sensors, stores } from './schema';

/** Sorts after every time there is. */
export const NEVER = 8.64e15;

/** Which freezers to write anew: one, or those of a store or an account. */
export type FleetPart = { freezerId: string } | { storeId: string } | { accountId: string };

/** Writes anew how lists show freezers, and takes out those no longer in use. */
export function writeFleetRows(db: ProducerDb, part: FleetPart): void {
  for (const found of sourceRows(db, wherePart(part))) {
    if (found.retired) db.delete(fleetRows, sql`${fleetRows.id} = ${found.id}`);
    else writeRow(db, found);
  }
}

function wherePart(part: FleetPart): SQL {
  if ('freezerId' in part) return sql`f.id = ${part.freezerId}`;
  if ('storeId' in part) return sql`f.store_id = ${part.storeId}`;
  return sql`s.account_id = ${part.accountId}`;
}

interface SourceRow extends Omit<FleetRow, 'lanes' | 'truck' | 'riskAt'> {
  retired: number;
  districtId: string;
  accountId: string;
  street: string;
  phone: string;
  account: string;
  riskLimit: number;
  truckFrom: number | null;
  truckTo: number | null;
  lanes: string;
  levels: string | null;
}

/** Everything a row shows, sorts by or is found by; a freezer without a sensor has no level. */
const sourceRows = (db: ProducerDb, where: SQL): SourceRow[] =>
  db.view<SourceRow>(
    (producer) => sql`
    select f.id, f.retired_at is not null as retired, f.name, f.asset_number as "assetNumber", s.id as "storeId", s.name as store,
      s.street, s.city, s.phone, s.time_zone as "timeZone", s.district_id as "districtId", a.id as "accountId",
      a.number as "accountNumber", a.name as account, p.risk_limit as "riskLimit", n.serial, st.at, st.pounds, st.share,
      st.air_f as "airF", st.warm_since as "warmSince", st.run_out_early as early, st.run_out_likely as likely,
      st.run_out_late as late, t."from" as "truckFrom", t."to" as "truckTo", st.state ->> '$.level.lanes' as levels,
      (select json_group_array(pr.name order by l.position) from ${lanes} l
        join ${products} pr on pr.producer_id = ${producer} and pr.id = l.product_id
        where l.producer_id = ${producer} and l.freezer_id = f.id) as lanes
    from ${freezers} f
    cross join ${producers} p on p.id = ${producer}
    join ${stores} s on s.producer_id = ${producer} and s.id = f.store_id
    join ${accounts} a on a.producer_id = ${producer} and a.id = s.account_id
    left join ${installs} i on i.producer_id = ${producer} and i.freezer_id = f.id and i."to" is null
    left join ${sensors} n on n.producer_id = ${producer} and n.id = i.sensor_id
    left join ${freezerStates} st on st.producer_id = ${producer} and st.id = f.id and n.id is not null
    left join ${nextTrucks} t on t.producer_id = ${producer} and t.store_id = s.id
    where f.producer_id = ${producer} and ${where}`,
  );

function writeRow(db: ProducerDb, row: SourceRow): void {
  const { id, storeId, districtId, accountId, truckFrom, truckTo, likely, at, warmSince, serial } = row;
  const written = {
    storeId,
    districtId,
    accountId,
    likely: likely ?? NEVER,
    riskAt: riskAt(row, row.riskLimit),
    truckFrom,
    truckTo,
    heardAt: at,
    warmSince,
    fitted: serial !== null,
    words: searchText(row.store, row.street, row.city, row.account, row.accountNumber, row.name, row.assetNumber, serial ?? '', row.phone),
    body: bodyOf(row),
  };
  db.upsert(fleetRows, { id, ...written }, written);
}

/** The answer's own JSON. */
function bodyOf(row: SourceRow): string {
  const { id, name, assetNumber, storeId, store, city, accountNumber, timeZone, serial, at, warmSince, early, likely, late } = row;
  const truck = row.truckFrom === null || row.truckTo === null ? null : { from: row.truckFrom, to: row.truckTo };
  const body: FleetRow = {
    ...{ id, name, assetNumber, storeId, store, city, accountNumber, timeZone, serial, at, warmSince, early, likely, late },
    pounds: rounded(row.pounds, 1),
    share: rounded(row.share, 3),
    airF: rounded(row.airF, 1),
    riskAt: riskAt(row, row.riskLimit),
    truck,
    lanes: lanesOf(row),
  };
  return JSON.stringify(body);
}

/** No more digits than a list could show. */
const rounded = (value: number | null, digits: number): number | null => (value === null ? null : Number(value.toFixed(digits)));

interface LaneLevel {
  bags: number;
  pounds: number;
  capacityPounds: number;
}

/** Both lists are written by this server: names of products and, where there is a level, the level's lanes. */
function lanesOf({ lanes: names, levels }: SourceRow): FleetRow['lanes'] {
  const known = levels === null ? [] : (JSON.parse(levels) as LaneLevel[]);
  return (JSON.parse(names) as string[]).map((product, i) => {
    const level = known[i];
    if (!level) return { product, bags: null, share: null };
    return { product, bags: level.bags, share: rounded(level.capacityPounds > 0 ? level.pounds / level.capacityPounds : 0, 3) };
  });
}

const BATCH = 500;

/** Writes the rows that are missing: of a database older than they are, or of freezers put in by hand. */
export function fillFleetRows(db: ProducerDb): void {
  const missing = db.view<{ id: string }>(
    (producer) => sql`
    select f.id from ${freezers} f
    where f.producer_id = ${producer} and f.retired_at is null
      and not exists (select 1 from ${fleetRows} r where r.producer_id = ${producer} and r.id = f.id)`,
  );
  for (let from = 0; from < missing.length; from += BATCH) {
    const ids = JSON.stringify(missing.slice(from, from + BATCH).map(({ id }) => id));
    for (const found of sourceRows(db, sql`f.id in (select value from json_each(${ids}))`)) writeRow(db, found);
  }
}

/** Works out anew from when on each freezer is at risk, after the producer changed its limit. */
export function writeRiskLimit(db: ProducerDb, limit: number): void {
  const rows = db.view<{ id: string; body: string }>((producer) => sql`select r.id, r.body from ${fleetRows} r where r.producer_id = ${producer}`);
  for (const { id, body } of rows) {
    // Written by `bodyOf`.
    const row = JSON.parse(body) as FleetRow;
    const at = riskAt(row, limit);
    db.update(fleetRows, id, { riskAt: at, body: JSON.stringify({ ...row, riskAt: at }) });
  }
}
