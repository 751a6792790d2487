import { useTranslation } from 'react-i18next';
import type { FleetColumn, FleetRow } from '../../../server/contract/fleet';
import { comingTruck, levelUsable, type FleetStanding } from '../../../server/domain/fleet-standing';
import { freshnessOf } from '../../../server/domain/freshness';
import { LevelMini } from '../../freezer/level-mini';
import { useFormat } from '../../lib/format';
import { isLow } from '../stores/lane-low';
import { truckWords } from '../stores/truck-words';
import { Clocks } from './clocks';
import { LikelyCell } from './likely-cell';
import { StandingTag } from './standing-tag';
import { Unknown } from './unknown';

export interface CellProps {
  row: FleetRow;
  standing: FleetStanding;
  now: number;
  /** Little room: what the drawings say is not said again, nor the span drawn. */
  narrow: boolean;
}

/** One column of one row. */
export function FleetCell({ column, ...cell }: CellProps & { column: FleetColumn }) {
  const { row, standing, now } = cell;
  switch (column) {
    case 'level':
      return <LevelCell {...cell} />;
    case 'air':
      return <AirCell {...cell} />;
    case 'likely':
      return <LikelyCell {...cell} />;
    case 'truck':
      return <TruckCell {...cell} />;
    case 'state':
      return <StandingTag standing={standing} now={now} />;
    case 'account':
      return row.accountNumber;
    case 'asset':
      return row.assetNumber;
    case 'serial':
      return row.serial ?? <Unknown />;
    case 'heard':
      return <HeardCell {...cell} />;
  }
}

function LevelCell({ row, now, narrow }: CellProps) {
  const { t } = useTranslation('freezers');
  const format = useFormat();
  const { at, pounds, lanes } = row;
  if (!levelUsable(row, now) || at === null || pounds === null) return <Unknown />;
  const said = lanes.flatMap(({ product, share }) => (share === null ? [] : [t('level.lane', { product, share: format.percent(share) })]));
  return (
    <span className="flex items-center gap-2.5">
      <LevelMini label={format.list(said)} lanes={lanes.map(({ share }) => ({ share, low: share !== null && isLow({ pounds: share, capacityPounds: 1 }) }))} />
      <span className="whitespace-nowrap">
        {!narrow && format.pounds(pounds)}
        {freshnessOf(at, now) !== 'fresh' && <span className="block text-small text-straw">{t('level.old', { age: format.duration(now - at) })}</span>}
      </span>
    </span>
  );
}

function AirCell({ row, standing, now }: CellProps) {
  const format = useFormat();
  if (!levelUsable(row, now) || row.airF === null) return <Unknown />;
  return <span className={`whitespace-nowrap ${standing.kind === 'warm' ? 'font-semibold text-rust' : ''}`}>{format.degrees(row.airF)}</span>;
}

function TruckCell({ row: { truck, timeZone }, now }: CellProps) {
  const { t } = useTranslation('freezers');
  if (!truck) return <span className="text-ink-3">{t('truck.none')}</span>;
  const coming = comingTruck(truck, now);
  return <Clocks zone={timeZone} now={now} say={(format) => (coming ? truckWords(coming, format, now) : t('truck.past', { window: truckWords(truck, format, now) }))} />;
}

function HeardCell({ row: { at }, now }: CellProps) {
  const format = useFormat();
  return at === null ? <Unknown /> : <span className="whitespace-nowrap">{format.ago(at, now)}</span>;
}
