import { useTranslation } from 'react-i18next';
import { CartesianGrid, Line, LineChart, ReferenceLine, XAxis, YAxis } from 'recharts';
import { useWidth } from '../../../freezer/use-width';
import { useFormat } from '../../../lib/format';
import { airRows, airTicks, airSpan, type Air } from './air-data';

interface Props {
  air: Air;
  zone: string;
  now: number;
  /** °F above which ice begins to melt. */
  mark: number;
}

const height = 176;
const tick = { fill: 'var(--ink-3)', fontSize: 11 };
/** Narrower days than these have no room for their names. */
const dayWidth = 34;

/** The air of the last days as one line under the mark where melting begins. */
export default function AirChart({ air, zone, now, mark }: Props) {
  const { t } = useTranslation('freezer-page');
  const format = useFormat(zone);
  const [box, width] = useWidth();
  const { from, to, middles } = airSpan(air, now, zone);
  const ticks = airTicks(air, mark);
  const every = width === null ? 1 : Math.ceil((middles.length * dayWidth) / width);
  return (
    <div ref={box} aria-hidden className="mt-2 h-44">
      {width !== null && (
        <LineChart data={airRows(air)} width={width} height={height} margin={{ top: 8, right: 6, bottom: 0, left: 0 }} accessibilityLayer={false}>
          <CartesianGrid vertical={false} stroke="var(--rule)" />
          <XAxis
            dataKey="at"
            type="number"
            domain={[from, to]}
            ticks={middles.filter((_, i) => (middles.length - 1 - i) % every === 0)}
            interval={0}
            tickFormatter={(at: number) => format.weekday(at, 'short')}
            tick={tick}
            tickLine={false}
            axisLine={{ stroke: 'var(--edge)' }}
          />
          <YAxis domain={[ticks.at(0) ?? 0, ticks.at(-1) ?? mark]} ticks={ticks} interval={0} width={38} axisLine={false} tickLine={false} tickFormatter={(value: number) => `${value}°`} tick={tick} />
          <ReferenceLine
            y={mark}
            stroke="var(--rust)"
            strokeDasharray="6 4"
            label={{ value: t('air.mark', { mark: format.degrees(mark) }), position: 'insideBottomLeft', fill: 'var(--rust)', fontSize: 12, fontWeight: 600 }}
          />
          <Line dataKey="degrees" type="linear" stroke="var(--fjord)" strokeWidth={2} dot={false} activeDot={false} isAnimationActive={false} />
        </LineChart>
      )}
    </div>
  );
}
