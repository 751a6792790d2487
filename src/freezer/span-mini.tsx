interface Props {
  now: number;
  early: number | null;
  likely: number | null;
  late: number | null;
  truck: { from: number } | null;
  /** The run-out is trouble: a triangle in ember, else a dot. */
  trouble: boolean;
  /** The same in words. */
  label: string;
}

const days = 7;
const dayLong = 86_400_000;
const width = 152;
const height = 26;
const pad = 6;
const floor = 17;
const end = width - pad;
const inner = end - pad;

/** The cover ribbon in a table's row: from early to late on the seven days ahead, with the truck's mark above. */
export function SpanMini({ now, early, likely, late, truck, trouble, label }: Props) {
  const share = (at: number) => (at - now) / (days * dayLong);
  const x = (at: number) => pad + Math.min(1, Math.max(0, share(at))) * inner;
  const from = early ?? likely;
  return (
    <svg role="img" aria-label={label} width={width} height={height} viewBox={`0 0 ${width} ${height}`} className="block">
      <path d={`M${pad} ${floor}H${end}`} className="stroke-edge" />
      {Array.from({ length: days + 1 }, (_, i) => (
        <path key={i} d={`M${pad + (i / days) * inner} ${floor - 3}v6`} className="stroke-edge" />
      ))}
      {from !== null && share(from) < 1 && (
        <rect x={x(from)} y={floor - 3} width={Math.max(6, (late === null ? end : x(late)) - x(from))} height="6" rx="3" className={trouble ? 'fill-ember' : 'fill-fjord-2'} opacity=".5" />
      )}
      {likely !== null && share(likely) < 1 && <LikelyMark x={x(likely)} trouble={trouble} />}
      {truck && share(truck.from) < 1 && <path d={`M${x(truck.from)} 10.5l-5-8h10z`} className="fill-kelp" />}
    </svg>
  );
}

const LikelyMark = ({ x, trouble }: { x: number; trouble: boolean }) =>
  trouble ? (
    <path d={`M${x} ${floor - 6}l5.5 10h-11z`} className="fill-ember stroke-surface" strokeWidth="1" />
  ) : (
    <circle cx={x} cy={floor} r="4.5" className="fill-fjord-2 stroke-surface" strokeWidth="1" />
  );
