import { fleetColumns, type FleetColumn, type FleetRow } from '../../contract/fleet';
import { fleetView, placed, type FleetPlace, type Placed, type FleetSelection } from '../../db/views/fleet';
import { localMinute } from '../../domain/civil';
import { fleetStanding } from '../../domain/fleet-standing';
import type { ProducerContext } from '../../http/context';
import { fileWords } from '../words';

const BATCH = 500;

/** The selection as a table, batch by batch in the list's order: the store and the freezer, then the columns asked for. */
export function* fleetTable({ db, language, now }: ProducerContext, selection: FleetSelection, wanted: string | undefined): Generator<string[][]> {
  const t = fileWords(language);
  const columns = fleetColumns.filter((column) => (wanted === undefined || wanted.split(',').includes(column)) && (column !== 'truck' || selection.trucks));
  yield [[...FIRST, ...columns.flatMap((column) => cells[column].heads)].map((head) => t(`freezers.${head}`))];
  const say = (kind: string) => t(`freezers.standing.${kind}`);
  for (let after: FleetPlace | null = null; ; ) {
    const found: Placed[] = fleetView(db, selection, after, BATCH).map(placed);
    const last = found.at(-1);
    if (!last) return;
    const rows = found.map(({ row }): Told => (selection.trucks ? row : { ...row, truck: undefined }));
    yield rows.map((row) => [row.store, row.city, row.name, row.timeZone, ...columns.flatMap((column) => cells[column].of(row, now, say))]);
    after = last.place;
  }
}

const FIRST = ['store', 'city', 'freezer', 'timeZone'];

/** A row as its reader is told it; `truck` is undefined for whoever may not read of trucks. */
type Told = Omit<FleetRow, 'truck'> & { truck: FleetRow['truck'] | undefined };

interface Cells {
  heads: string[];
  of: (row: Told, now: number, say: (kind: string) => string) => string[];
}

const time = (at: number | null | undefined, { timeZone }: Told): string => (at === null || at === undefined ? '' : localMinute(at, timeZone));
const number = (value: number | null, digits = 0): string => (value === null ? '' : value.toFixed(digits));

const cells: Record<FleetColumn, Cells> = {
  level: { heads: ['level', 'share'], of: ({ pounds, share }) => [number(pounds), number(share === null ? null : share * 100)] },
  air: { heads: ['air'], of: ({ airF }) => [number(airF, 1)] },
  likely: { heads: ['early', 'likely', 'late'], of: (row) => [time(row.early, row), time(row.likely, row), time(row.late, row)] },
  truck: { heads: ['truck', 'truckTo'], of: (row) => [time(row.truck?.from, row), time(row.truck?.to, row)] },
  state: { heads: ['state'], of: (row, now, say) => [say(fleetStanding(row, now).kind)] },
  account: { heads: ['account'], of: ({ accountNumber }) => [accountNumber] },
  asset: { heads: ['asset'], of: ({ assetNumber }) => [assetNumber] },
  serial: { heads: ['serial'], of: ({ serial }) => [serial ?? ''] },
  heard: { heads: ['heard'], of: (row) => [time(row.at, row)] },
};
