import type { LaneReader, Rise, Told } from './lane-reader';

/** A lasting upward step: the first reading that shows it, and the measured pounds by lane. */
export interface DeliverySeen {
  at: number;
  pounds: number[];
}

/** A rise below this many pounds is no delivery. */
const LEAST_POUNDS = 25;
/** Rises this near each other are one truck's. */
const ONE_VISIT_MS = 2 * 3_600_000;
/** The first reading of a rise and the ones after it, which say whether it lasts. */
const LOOK = 3;

/**
 * Finds deliveries in the lanes' pounds over time: a rise of any lane beyond max(25 lb, 3 sd of it) that lasts through
 * the next readings, as far as there are any. Answers the deliveries and the index of the first reading of each rise.
 */
export function deliveriesSeen(told: Told[], reader: LaneReader): { seen: DeliverySeen[]; starts: number[] } {
  const seen: DeliverySeen[] = [];
  const starts: number[] = [];
  told.forEach((now, i) => {
    const before = told[i - 1];
    const rise = before && reader.rise(before, now);
    if (!rise || !rise.pounds.some((_, lane) => isBig(rise, lane) && lasts(told, i, reader, lane))) return;
    starts.push(i);
    const brought = rise.pounds.map((pounds) => Math.max(0, pounds));
    const last = seen.at(-1);
    if (last && now.at - last.at <= ONE_VISIT_MS) last.pounds = last.pounds.map((pounds, lane) => pounds + (brought[lane] ?? 0));
    else seen.push({ at: now.at, pounds: brought });
  });
  return { seen, starts };
}

const isBig = ({ pounds, sdPounds }: Rise, lane: number): boolean => (pounds[lane] ?? 0) > Math.max(LEAST_POUNDS, 3 * (sdPounds[lane] ?? 0));

function lasts(told: Told[], i: number, reader: LaneReader, lane: number): boolean {
  const before = told[i - 1];
  return told.slice(i + 1, i + LOOK).every((after) => {
    const rise = before ? reader.rise(before, after) : null;
    return rise === null || isBig(rise, lane);
  });
}
