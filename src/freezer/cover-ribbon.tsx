import { Area, CartesianGrid, ComposedChart, Line, XAxis, YAxis } from 'recharts';
import type { Language } from '../../server/contract/words';
import { CoverRibbonSkeleton, ribbonHeight } from './cover-ribbon-skeleton';
import { daysOf, rowsOf, spanOf, type RibbonData } from './ribbon-data';
import { RibbonBack, RibbonFront } from './ribbon-overlay';
import { RibbonSaid } from './ribbon-said';
import { useWidth } from './use-width';

interface Props extends RibbonData {
  locale: Language;
  /** What the drawing is, for those who hear the page. */
  title: string;
}

/** Days left and right of now: the level as it was, and as it is likely to be when the next truck meets it. */
export function CoverRibbon({ locale, title, ...data }: Props) {
  const [box, width] = useWidth();
  const withHighs = data.highs !== undefined;
  return (
    <figure aria-label={title} className="m-0 min-w-0">
      <div ref={box} aria-hidden className={withHighs ? 'h-48' : 'h-44'}>
        {width === null ? <CoverRibbonSkeleton withHighs={withHighs} /> : <Drawing data={data} width={width} height={ribbonHeight(withHighs)} locale={locale} />}
      </div>
      <RibbonSaid data={data} locale={locale} />
    </figure>
  );
}

export default CoverRibbon;

interface DrawingProps {
  data: RibbonData;
  width: number;
  height: number;
  locale: Language;
}

const still = { isAnimationActive: false, dot: false, activeDot: false } as const;
/** Above the plot stand "now" and the truck's words, below it the days. */
const wordsAbove = 26;
const plotHeight = 116;
const percentTick = { fill: 'var(--ink-3)', fontSize: 11 };

function Drawing({ data, width, height, locale }: DrawingProps) {
  const span = spanOf(data);
  const margin = { top: wordsAbove, right: 6, bottom: height - wordsAbove - plotHeight, left: 0 };
  return (
    <ComposedChart data={rowsOf(span, data)} width={width} height={height} margin={margin} accessibilityLayer={false}>
      <CartesianGrid vertical={false} horizontalValues={[0, 50, 100]} stroke="var(--rule)" />
      <XAxis dataKey="at" type="number" domain={[span.from, span.to]} allowDataOverflow hide />
      <YAxis domain={[0, 100]} ticks={[0, 50, 100]} width={38} axisLine={false} tickLine={false} tickFormatter={(value: number) => `${value}%`} tick={percentTick} />
      <RibbonBack data={data} span={span} />
      <Area dataKey="past" type="linear" stroke="var(--fjord)" strokeWidth={2} fill="var(--ice)" fillOpacity={0.75} {...still} />
      <Area dataKey="band" type="linear" stroke="none" fill="var(--fjord-2)" fillOpacity={0.2} {...still} />
      <Line dataKey="likely" type="linear" stroke="var(--fjord)" strokeWidth={2} strokeDasharray="5 4" {...still} />
      <RibbonFront data={data} span={span} days={daysOf(span, data)} locale={locale} />
    </ComposedChart>
  );
}
