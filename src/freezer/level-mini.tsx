interface Props {
  /** Left to right, with the share of the lane's own full stack; null where no probe says. */
  lanes: readonly { share: number | null; low: boolean }[];
  /** The same in words. */
  label: string;
}

const width = 64;
const height = 30;
const frame = 3;

/** The front section in a table's row: a column a lane, a low one hatched by lines of the paper. */
export function LevelMini({ lanes, label }: Props) {
  const step = (width - 2 * frame) / Math.max(1, lanes.length);
  return (
    <svg role="img" aria-label={label} width={width} height={height} viewBox={`0 0 ${width} ${height}`} className="block shrink-0">
      <rect x=".5" y=".5" width={width - 1} height={height - 1} rx="3" className="fill-ice-3 stroke-edge" />
      {lanes.map(({ share, low }, i) => share !== null && <Lane key={i} x={frame + i * step + 0.75} width={step - 1.5} share={share} low={low} />)}
    </svg>
  );
}

function Lane({ x, width, share, low }: { x: number; width: number; share: number; low: boolean }) {
  const tall = Math.max(1.5, Math.min(1, share) * (height - 2 * frame));
  const y = height - frame - tall;
  return (
    <>
      <rect x={x} y={y} width={width} height={tall} rx="1" className={low ? 'fill-ember' : 'fill-fjord-2'} />
      {low && tall > 3 && <path d={`M${x} ${y + tall / 2}h${width}`} className="stroke-surface" strokeWidth="1" strokeDasharray="2 2" />}
    </>
  );
}
