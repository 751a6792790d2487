/** A lasting upward step: the first reading that shows it, and the measured pounds by lane. */
export interface DeliverySeen {
  at: number;
  pounds: number[];
}

/** A rise below this many pounds is no delivery. */
const LEAST_POUNDS = 25;
/** Rises this near each other are one truck's. */
const ONE_VISIT_MS = 2 * 3_600_000;
/** Readings on either side that say whether a rise lasts. */
const LOOK = 3;

/**
 * Finds deliveries in the lanes' pounds over time. `pounds[i]` are the lanes at `at[i]`; `sdPounds` is one sd of a
 * lane's level from its stack alone. A rise counts beyond max(25 lb, 3 sd of a difference) and must last.
 * Answers the deliveries and the index of the first reading after each rise.
 */
export function deliveriesSeen(at: number[], pounds: number[][], sdPounds: number[]): { seen: DeliverySeen[]; starts: number[] } {
  const seen: DeliverySeen[] = [];
  const starts: number[] = [];
  for (let i = 1; i < at.length; i += 1) {
    const rises = sdPounds.map((_, lane) => rise(pounds, lane, i));
    const real = rises.some((pound, lane) => pound > threshold(sdPounds[lane] ?? 0) && lasting(pounds, lane, i) > threshold(sdPounds[lane] ?? 0));
    if (!real) continue;
    starts.push(i);
    const now = at[i] ?? 0;
    const last = seen.at(-1);
    if (last && now - last.at <= ONE_VISIT_MS) last.pounds = last.pounds.map((pound, lane) => pound + Math.max(0, rises[lane] ?? 0));
    else seen.push({ at: now, pounds: rises.map((pound) => Math.max(0, pound)) });
  }
  return { seen, starts };
}

const threshold = (sd: number): number => Math.max(LEAST_POUNDS, 3 * Math.SQRT2 * sd);

const rise = (pounds: number[][], lane: number, i: number): number => (pounds[i]?.[lane] ?? 0) - (pounds[i - 1]?.[lane] ?? 0);

/** The lowest of the readings after it above the highest just before it. */
function lasting(pounds: number[][], lane: number, i: number): number {
  const before = pounds.slice(Math.max(0, i - 1), i).map((lanes) => lanes[lane] ?? 0);
  const after = pounds.slice(i, i + LOOK).map((lanes) => lanes[lane] ?? 0);
  return Math.min(...after) - Math.max(...before);
}
