interface LevelProps {
  /** Left to right, with the share of the lane's own full stack. */
  lanes: readonly { share: number; low: boolean }[];
  /** The same in words. */
  label: string;
}

const level = { width: 64, height: 30 };

/** The front section in a table's row: a column a lane, a low one hatched by lines of the paper. */
export function LevelMini({ lanes, label }: LevelProps) {
  const step = (level.width - 6) / Math.max(1, lanes.length);
  return (
    <svg role="img" aria-label={label} width={level.width} height={level.height} viewBox={`0 0 ${level.width} ${level.height}`} className="block">
      <rect x=".5" y=".5" width={level.width - 1} height={level.height - 1} rx="3" className="fill-ice-3 stroke-edge" />
      {lanes.map(({ share, low }, i) => {
        const height = Math.max(1.5, Math.min(1, share) * (level.height - 6));
        const x = 3 + i * step + 0.75;
        const y = level.height - 3 - height;
        return (
          <g key={i}>
            <rect x={x} y={y} width={step - 1.5} height={height} rx="1" className={low ? 'fill-ember' : 'fill-fjord-2'} />
            {low && height > 4 && <path d={`M${x} ${y + height / 2}h${step - 1.5}`} className="stroke-surface" strokeWidth="1" strokeDasharray="2 2" />}
          </g>
        );
      })}
    </svg>
  );
}

interface SpanProps {
  now: number;
  early: number | null;
  likely: number | null;
  late: number | null;
  truck: { from: number; to: number } | null;
  label: string;
  days?: number;
}

const track = { width: 184, height: 26, pad: 6, y: 17 };
const dayLong = 86_400_000;

/** The cover ribbon in a table's row: from early to late on the days ahead, with the truck's mark above. Before the truck the likely hour is a triangle, else a dot. */
export function SpanMini({ now, early, likely, late, truck, label, days = 7 }: SpanProps) {
  const inner = track.width - 2 * track.pad;
  const share = (at: number) => (at - now) / (days * dayLong);
  const x = (at: number) => track.pad + Math.min(1, Math.max(0, share(at))) * inner;
  const trouble = likely !== null && truck !== null && likely < truck.to;
  const from = early ?? likely;
  const tone = trouble ? 'fill-ember' : 'fill-fjord-2';
  const end = track.width - track.pad;
  return (
    <svg role="img" aria-label={label} width={track.width} height={track.height} viewBox={`0 0 ${track.width} ${track.height}`} className="block max-w-full">
      <path d={`M${track.pad} ${track.y}H${end}`} className="stroke-edge" />
      {Array.from({ length: days + 1 }, (_, i) => (
        <path key={i} d={`M${track.pad + (i / days) * inner} ${track.y - 3}v6`} className="stroke-edge" />
      ))}
      {from !== null && share(from) < 1 && (
        <rect x={x(from)} y={track.y - 3} width={Math.max(6, (late === null ? end : x(late)) - x(from))} height="6" rx="3" className={tone} opacity=".5" />
      )}
      {likely !== null && share(likely) < 1 && <LikelyMark x={x(likely)} trouble={trouble} />}
      {truck && share(truck.from) < 1 && <path d={`M${x(truck.from)} 10.5l-5-8h10z`} className="fill-kelp" />}
    </svg>
  );
}

const LikelyMark = ({ x, trouble }: { x: number; trouble: boolean }) =>
  trouble ? (
    <path d={`M${x} ${track.y - 6}l5.5 10h-11z`} className="fill-ember stroke-surface" strokeWidth="1" />
  ) : (
    <circle cx={x} cy={track.y} r="4.5" className="fill-fjord-2 stroke-surface" strokeWidth="1" />
  );
