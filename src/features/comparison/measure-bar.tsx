import { useFormat } from '../../lib/format';
import { tenth, type Measure } from './measures';

interface Props {
  measure: Measure;
  value: number;
  /** The most of any store of the list: a full bar. */
  most: number;
}

/** A number, and how it stands to the others'. */
export function MeasureBar({ measure, value, most }: Props) {
  const format = useFormat();
  const shown = tenth(value);
  return (
    <>
      <span className={`block ${shown > 0 ? '' : 'text-ink-3'}`}>{format.tenths(shown)}</span>
      <span aria-hidden className="mt-1 block h-1.5 w-full max-w-28 overflow-hidden rounded-tag bg-sunk">
        <span className={`block h-full ${tones[measure]}`} style={{ width: `${most > 0 ? (value / most) * 100 : 0}%` }} />
      </span>
    </>
  );
}

const tones: Record<Measure, string> = {
  outDays: 'bg-ember',
  warmHours: 'bg-rust',
  openRequests: 'bg-straw',
  solvedRequests: 'bg-fjord-2',
  deliveries: 'bg-kelp',
  lateDeliveries: 'bg-straw',
};
