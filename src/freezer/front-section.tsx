import { useId } from 'react';
import { useTranslation } from 'react-i18next';
import { useFormat } from '../lib/format';
import { bagOutlines } from './section-bags';
import { drawingWidth, layOut, type LaneBox, type ProbeMark, type Section, type SectionLane, type SectionMeasures, type SectionProbe } from './section-geometry';
import { useSectionSaid } from './section-said';

interface Props extends SectionMeasures {
  probes: SectionProbe[];
  lanes: SectionLane[];
  /** The air in the freezer, such as "18 °F"; empty where it is not known. */
  airText: string;
  /** Said where the readings are old, such as "Mon 3:10 pm"; the bags are then drawn as outlines of what was there. */
  asOf?: string;
}

/** One freezer cut open, drawn from its readings: channel on top, what each probe sees, the bags of every lane. */
export function FrontSection({ probes, lanes, airText, asOf, ...measures }: Props) {
  const { t } = useTranslation('freezer');
  const { inches } = useFormat();
  const said = useSectionSaid({ lanes, probes, airText, asOf });
  const texts = probes.map((probe) => ({ probe, text: probe.distanceIn === null ? t('section.no-signal') : inches(probe.distanceIn) }));
  const section = layOut(measures, lanes, texts);
  const { cabinet, inside } = section;
  const bottom = cabinet.y + cabinet.height;
  const height = bottom + 46 + (lanes.some(({ low, bags }) => low && bags > 0) ? 16 : 0);
  return (
    <figure className="m-0">
      <svg viewBox={`0 0 ${drawingWidth} ${height}`} width={drawingWidth} height={height} aria-hidden className="mx-auto block h-auto max-w-full">
        <text x={cabinet.x + 1} y={cabinet.y - 8} className="fill-ink-3 text-[12px]">
          {asOf ?? t('section.front')}
        </text>
        <text x={cabinet.x + cabinet.width - 1} y={cabinet.y - 8} textAnchor="end" className="fill-ink-2 text-[12px] font-semibold">
          {airText}
        </text>
        <Cabinet section={section} />
        {section.lanes.map((box, i) => (
          <Lane key={i} box={box} faint={asOf !== undefined} />
        ))}
        {section.lanes.slice(1).map(({ stack }, i) => (
          <path key={i} d={`M${stack.x} ${inside.y + 12}V${section.floorY}`} className="stroke-edge" strokeDasharray="3 3" />
        ))}
        <rect x={inside.x + 6} y={section.channelY - 5} width={inside.width - 12} height="5" rx="2" className="fill-ink" />
        {section.probes.map((mark, i) => (
          <Sight key={i} mark={mark} channelY={section.channelY} />
        ))}
        {section.probes.map((mark, i) => (
          <Chip key={i} mark={mark} />
        ))}
        {section.lanes.map((box, i) => (
          <LaneWords key={i} box={box} y={bottom + 24} />
        ))}
      </svg>
      <figcaption className="sr-only">{said.join(' ')}</figcaption>
    </figure>
  );
}

const Cabinet = ({ section: { cabinet, inside, floorY } }: { section: Section }) => (
  <>
    <path
      d={`M${cabinet.x + 12} ${cabinet.y + cabinet.height}v6M${cabinet.x + cabinet.width - 12} ${cabinet.y + cabinet.height}v6`}
      className="stroke-ink"
      strokeWidth="3"
    />
    <rect x={cabinet.x} y={cabinet.y} width={cabinet.width} height={cabinet.height} rx="5" className="fill-surface stroke-ink" strokeWidth="1.6" />
    <rect x={inside.x - 2} y={inside.y - 2} width={inside.width + 4} height={inside.height + 4} rx="2" className="fill-ice-3 stroke-edge" />
    <path d={`M${inside.x - 2} ${floorY + 1}h${inside.width + 4}`} className="stroke-edge" />
  </>
);

/** A low lane differs by its hatching as well as its colour; old readings leave only outlines. */
function Lane({ box: { lane, stack }, faint }: { box: LaneBox; faint: boolean }) {
  const hatch = useId();
  const outlines = bagOutlines(lane.bags, stack);
  const edge = lane.low ? 'stroke-ember' : 'stroke-ice-2';
  const fill = lane.low ? 'fill-ember-tint' : 'fill-ice';
  return (
    <g>
      <path d={outlines} className={`${edge} ${faint ? 'fill-none' : fill}`} strokeWidth=".9" />
      {lane.low && !faint && (
        <>
          <pattern id={hatch} width="5" height="5" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
            <path d="M0 0v5" className="stroke-ember" strokeWidth="1" opacity=".55" />
          </pattern>
          <path d={outlines} fill={`url(#${hatch})`} />
        </>
      )}
      {lane.low && <path d={`M${stack.x + 2} ${stack.y + stack.height}h${stack.width - 4}`} className="stroke-ember" strokeWidth="2" />}
    </g>
  );
}

/** From the probe down to the bags it sees; a silent probe sees nothing. */
const Sight = ({ mark: { x, endY }, channelY }: { mark: ProbeMark; channelY: number }) =>
  endY === null ? (
    <circle cx={x} cy={channelY + 1} r="3.6" className="fill-surface stroke-straw" strokeWidth="1.6" />
  ) : (
    <>
      <circle cx={x} cy={channelY} r="3" className="fill-ink" />
      <path d={`M${x} ${channelY + 4}V${Math.max(channelY + 4, endY - 1)}`} className="stroke-fjord-2" strokeWidth="1.3" strokeDasharray="2 3" />
      <path d={`M${x - 6} ${endY}h12`} className="stroke-fjord" strokeWidth="2" />
    </>
  );

const Chip = ({ mark: { chip, text, endY } }: { mark: ProbeMark }) => (
  <>
    <rect {...chip} rx="3" className={endY === null ? 'fill-straw-tint stroke-straw' : 'fill-surface stroke-rule'} strokeDasharray={endY === null ? '3 2' : undefined} />
    <text x={chip.x + chip.width / 2} y={chip.y + 12.5} textAnchor="middle" className={`text-[11px] font-semibold ${endY === null ? 'fill-straw' : 'fill-fjord'}`}>
      {text}
    </text>
  </>
);

/** Size, count and, where it is low, the word: one under the other, so that four lanes fit side by side. */
function LaneWords({ box: { lane, stack, centre }, y }: { box: LaneBox; y: number }) {
  const { t } = useTranslation('freezer');
  const { number } = useFormat();
  const tight = stack.width < 64;
  const count = t(lane.about ? 'section.count-about' : 'section.count', { count: lane.bags, bags: number(lane.bags) });
  const lines = [lane.bags > 0 && count, lane.bags === 0 ? t('section.empty') : lane.low && t('section.low')].filter((line) => line !== false);
  return (
    <g textAnchor="middle" className={`${tight ? 'text-[11px]' : 'text-[12px]'} ${lane.low ? 'fill-ember' : 'fill-ink'}`}>
      <text x={centre} y={y} className="font-bold">
        {lane.label}
      </text>
      {lines.map((line, i) => (
        <text key={line} x={centre} y={y + 16 * (i + 1)} className={line === count ? 'font-medium' : 'font-bold'}>
          {line}
        </text>
      ))}
    </g>
  );
}
