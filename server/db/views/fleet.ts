import { sql, type SQL } from 'drizzle-orm';
import type { FleetDigest, FleetRow, FleetShow, MapMark, MapStore } from '../../contract/fleet';
import { foldedWords } from '../../domain/folded-words';
import { SOON_MS } from '../../domain/fleet-standing';
import { SILENT_AFTER_MS, UNUSABLE_AFTER_MS } from '../../domain/freshness';
import { NEVER } from '../fleet-rows';
import type { ProducerDb } from '../producer-db';
import { fleetRows, stores } from '../schema';

/** Which freezers a list shows; `visible` is the viewer's scope in terms of `fleet_row`. */
export interface FleetSelection {
  visible: SQL;
  /** The viewer sees few stores: then their own are looked through rather than everybody's in order. */
  narrow: boolean;
  q?: string;
  district?: string;
  account?: string;
  store?: string;
  show?: FleetShow;
  /** Whether the viewer is told of trucks; if not, only a run-out within two days counts as near. */
  trucks: boolean;
  now: number;
}

export type FleetPlace = readonly [likely: number, id: string];

/**
 * The rows behind `after` as the answer's JSON, the soonest likely run-out first. Whoever sees few gets theirs sorted, and
 * only the page's rows fetched; `cross join` keeps SQLite from beginning with the other side.
 */
export function fleetView(db: ProducerDb, selection: FleetSelection, after: FleetPlace | null, limit: number): string[] {
  const where = conditions(db, selection);
  const behind = after ? sql`(fleet_row.likely, fleet_row.id) > (${after[0]}, ${after[1]})` : sql`1`;
  if (!selection.narrow) {
    return db.texts(
      (producer) => sql`
      select fleet_row.body from ${fleetRows} where fleet_row.producer_id = ${producer} and ${where} and ${behind}
      order by fleet_row.likely, fleet_row.id limit ${limit}`,
    );
  }
  return db.texts(
    (producer) => sql`
    select f.body
    from (select fleet_row.rowid as row from ${fleetRows}
      where fleet_row.producer_id = ${producer} and ${where} and ${behind}
      order by +fleet_row.likely, +fleet_row.id limit ${limit}) picked
    cross join ${fleetRows} f on f.producer_id = ${producer} and f.rowid = picked.row
    order by f.likely, f.id`,
  );
}

/** A row as it stands in the list, and where. */
export interface Placed {
  row: FleetRow;
  place: FleetPlace;
}

export function placed(json: string): Placed {
  // Written by `fleet-rows.ts`.
  const row = JSON.parse(json) as FleetRow;
  return { row, place: [row.likely ?? NEVER, row.id] };
}

/** How many there are of each kind, whatever the list is narrowed to. */
export function fleetDigest(db: ProducerDb, selection: FleetSelection): FleetDigest {
  const where = conditions(db, selection);
  const count = (show: FleetShow) => sql`coalesce(sum(${showing(show, selection)}), 0)`;
  const [digest] = db.view<FleetDigest>(
    (producer) => sql`
    select count(*) as "all", ${count('first')} as "first", ${count('warm')} as warm, ${count('silent')} as silent, ${count('unfitted')} as unfitted
    from ${fleetRows} where fleet_row.producer_id = ${producer} and ${where}`,
  );
  if (!digest) throw new Error('a count of nothing is a row too');
  return digest;
}

/** The selection by store, for the map; the worst of its freezers marks a store. */
export function fleetMap(db: ProducerDb, selection: FleetSelection): MapStore[] {
  const where = conditions(db, selection);
  const rank = sql`case when ${showing('warm', selection)} then 0 when ${showing('first', selection)} then 1
    when ${showing('silent', selection)} then 2 else 3 end`;
  const rows = db.view<Omit<MapStore, 'mark'> & { rank: number }>(
    (producer) => sql`
    select s.id, s.name, s.city, s.latitude, s.longitude, picked.freezers, nullif(picked.likely, ${NEVER}) as likely, picked.rank
    from (select fleet_row.store_id, count(*) as freezers, min(fleet_row.likely) as likely, min(${rank}) as rank
      from ${fleetRows} where fleet_row.producer_id = ${producer} and ${where} group by fleet_row.store_id) picked
    cross join ${stores} s on s.producer_id = ${producer} and s.id = picked.store_id
    order by picked.rank, picked.likely, s.id`,
  );
  return rows.map(({ rank, ...store }) => ({ ...store, mark: marks[rank] ?? 'fine' }));
}

const marks: MapMark[] = ['warm', 'first', 'silent', 'fine'];

function conditions(db: ProducerDb, selection: FleetSelection): SQL {
  const { visible, q, district, account, store, show } = selection;
  const wanted = [
    visible,
    district && sql`fleet_row.district_id = ${district}`,
    account && sql`fleet_row.account_id = ${account}`,
    store && sql`fleet_row.store_id = ${store}`,
    show && showing(show, selection),
    q && found(db, q),
  ].filter((one): one is SQL => Boolean(one));
  return sql.join(wanted, sql` and `);
}

/** The rules of `domain/fleet-standing.ts`, asked of rows; each is 1 or 0. */
function showing(show: FleetShow, { trucks, now }: FleetSelection): SQL {
  const usable = sql`fleet_row.heard_at >= ${now - UNUSABLE_AFTER_MS}`;
  if (show === 'unfitted') return sql`(fleet_row.fitted = 0)`;
  if (show === 'silent') return sql`(fleet_row.fitted = 1 and coalesce(fleet_row.heard_at, 0) < ${now - SILENT_AFTER_MS})`;
  if (show === 'warm') return sql`(fleet_row.warm_since is not null and ${usable})`;
  const soon = sql`fleet_row.likely < ${now + SOON_MS}`;
  const near = trucks ? sql`case when fleet_row.truck_to >= ${now} then fleet_row.risk_at < fleet_row.truck_from else ${soon} end` : soon;
  return sql`coalesce(${usable} and ${near}, 0)`;
}

/** A search that finds more than this is answered by looking through the rows in the order they are shown. */
const FEW = 1000;
const MOST_WORDS = 8;

/** Rows in which every word begins some word; by the index where that leaves few, by the rows' own words where not. */
function found(db: ProducerDb, q: string): SQL | undefined {
  const words = foldedWords(q).slice(0, MOST_WORDS);
  if (words.length === 0) return undefined;
  const query = words.map((word) => `${word}*`).join(' ');
  const hits = db.view<{ no: number }>(() => sql`select rowid as no from fleet_text where fleet_text match ${query} limit ${FEW + 1}`);
  if (hits.length <= FEW) return sql`fleet_row.no in (select value from json_each(${JSON.stringify(hits.map(({ no }) => no))}))`;
  return sql`(${sql.join(words.map((word) => sql`instr(fleet_row.words, ${` ${word}`}) > 0`), sql` and `)})`;
}
