import { useTranslation } from 'react-i18next';
import { DefaultZIndexes, usePlotArea, ZIndexLayer } from 'recharts';
import type { Language } from '../../server/contract/words';
import { formatIn } from '../lib/format';
import { placeWords, type RibbonData, type RibbonDay, type Span } from './ribbon-data';
import { textWidth } from './section-geometry';

interface Props {
  data: RibbonData;
  span: Span;
  days: RibbonDay[];
  locale: Language;
}

const wordSize = 12;

/** Where instants lie in the chart, once it knows its own size. */
function usePlot({ from, to }: Span) {
  const area = usePlotArea();
  if (!area) return null;
  const x = (at: number) => area.x + (Math.min(1, Math.max(0, (at - from) / (to - from)))) * area.width;
  return { x, left: area.x, right: area.x + area.width, top: area.y, floor: area.y + area.height };
}

/** Under the lines: the truck as an upright band. */
export function RibbonBack({ data: { truck }, span }: Pick<Props, 'data' | 'span'>) {
  const plot = usePlot(span);
  if (!plot || !truck || truck.from > span.to) return null;
  const x = plot.x(truck.from);
  const width = Math.max(4, plot.x(truck.to) - x);
  return (
    <g>
      <rect x={x} y={plot.top} width={width} height={plot.floor - plot.top} className="fill-kelp" opacity=".18" />
      <path d={`M${x} ${plot.top - 4}V${plot.floor}M${x + width} ${plot.top - 4}V${plot.floor}`} className="stroke-kelp" />
    </g>
  );
}

/** Over the lines: the floor with its days and deliveries, the empty stretch, and the words on top. */
export function RibbonFront(props: Props) {
  const plot = usePlot(props.span);
  if (!plot) return null;
  return (
    <ZIndexLayer zIndex={DefaultZIndexes.axis}>
      <Days {...props} plot={plot} />
      {props.data.deliveries
        .filter(({ at }) => at >= props.span.from)
        .map(({ at }) => (
          <path key={at} d={`M${plot.x(at)} ${plot.floor + 1}l-4.5 7.5h9z`} className="fill-fjord" />
        ))}
      <Empty {...props} plot={plot} />
      <Words {...props} plot={plot} />
    </ZIndexLayer>
  );
}

type Drawn = Props & { plot: NonNullable<ReturnType<typeof usePlot>> };

/** Names shorten to letters, and every second high is left out, where a day is narrow. */
function Days({ data: { timeZone }, days, locale, plot }: Drawn) {
  const { weekday } = formatIn({ locale, timeZone });
  const narrow = (plot.right - plot.left) / days.length < 36;
  return days.map(({ day, start, middle, today, high }, i) => (
    <g key={day} textAnchor="middle">
      {i > 0 && <path d={`M${plot.x(start)} ${plot.floor}v5`} className="stroke-edge" />}
      <text x={plot.x(middle)} y={plot.floor + 21} className={`text-[12px] ${today ? 'fill-ink font-bold' : 'fill-ink-2'}`}>
        {narrow ? weekday(middle, 'narrow') : weekday(middle, 'short')}
      </text>
      {high !== null && !(narrow && i % 2 === 1) && (
        <text x={plot.x(middle)} y={plot.floor + 37} className="fill-ink-3 text-[11px]">
          {Math.round(high)}°
        </text>
      )}
    </g>
  ));
}

/** A bar on the floor; its word stands over it, or beyond the truck where it would run into the lines. */
function Empty({ data: { now, empty, truck }, span, plot }: Drawn) {
  const { t } = useTranslation('freezer');
  if (!empty || empty.from >= span.to) return null;
  const from = plot.x(empty.from);
  const to = Math.max(from + 6, plot.x(empty.to));
  const word = t('ribbon.empty');
  const width = textWidth(word, wordSize);
  const room = { left: plot.x(now) + 4, right: truck ? plot.x(truck.from) - 4 : plot.right };
  const fits = room.right - room.left >= width;
  const over = Math.min(room.right - width / 2, Math.max(room.left + width / 2, (from + to) / 2));
  const beyond = Math.min(plot.right, (truck ? plot.x(truck.to) : to) + 6 + width) - width / 2;
  return (
    <>
      <path d={`M${from + 2.5} ${plot.floor - 1}H${to - 2.5}`} className="stroke-ember" strokeWidth="5" strokeLinecap="round" />
      <text x={fits ? over : beyond} y={plot.floor - 7} textAnchor="middle" paintOrder="stroke" strokeWidth="4" strokeLinejoin="round" className="fill-ember stroke-surface text-[12px] font-bold">
        {word}
      </text>
    </>
  );
}

function Words({ data: { now, truck }, span, plot }: Drawn) {
  const { t } = useTranslation('freezer');
  const word = t('ribbon.now');
  const shown = truck && truck.from <= span.to ? truck : null;
  const nowX = plot.x(now);
  const truckWord = shown && { centre: (plot.x(shown.from) + plot.x(shown.to)) / 2, width: textWidth(shown.label, wordSize) };
  const [nowAt, truckAt] = placeWords({ centre: nowX, width: textWidth(word, wordSize) }, truckWord, 0, plot.right);
  return (
    <g textAnchor="middle" className="text-[12px] font-semibold">
      <path d={`M${nowX} ${plot.top - 4}V${plot.floor}`} className="stroke-ink" strokeWidth="1.2" />
      <text x={nowAt} y={plot.top - 9} className="fill-ink">
        {word}
      </text>
      {shown && truckAt !== null && (
        <text x={truckAt} y={plot.top - 9} className="fill-kelp">
          {shown.label}
        </text>
      )}
    </g>
  );
}
