/** Where the parts of a freezer's front section lie, in pixels of the drawing. Measures of the freezer are in inches. */
export interface SectionProbe {
  /** From the left inside wall. */
  xIn: number;
  /** Down from the channel; null while it is silent. */
  distanceIn: number | null;
}

export interface SectionLane {
  /** Left to right; shares sum to one. */
  widthShare: number;
  /** The bag's size in words, such as "20 lb". */
  label: string;
  bags: number;
  /** The count is uncertain by more than one bag. */
  about: boolean;
  stackIn: number;
  usableStackIn: number;
  bagPounds: number;
  low: boolean;
}

export interface SectionMeasures {
  widthIn: number;
  heightIn: number;
  channelDropIn: number;
  rackIn: number;
}

export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

export interface LaneBox {
  lane: SectionLane;
  /** The stack of bags. */
  stack: Box;
  centre: number;
}

export interface ProbeMark {
  x: number;
  /** Where the line meets the bags; null while the probe is silent. */
  endY: number | null;
  /** The label's place. */
  chip: Box;
  text: string;
}

export const drawingWidth = 260;
const side = 10;
const wall = 7;
const headRoom = 24;
const chipHeight = 17;
const gap = 3;

export type Section = ReturnType<typeof layOut>;

export function layOut(measures: SectionMeasures, lanes: SectionLane[], probes: { probe: SectionProbe; text: string }[]) {
  const inside = insideOf(measures);
  const scaleY = inside.height / measures.heightIn;
  const floorY = inside.y + inside.height - measures.rackIn * scaleY;
  const channelY = inside.y + Math.max(5, measures.channelDropIn * scaleY);
  return {
    inside,
    cabinet: grown(inside, wall),
    floorY,
    channelY,
    lanes: laneBoxes(lanes, inside, floorY, scaleY),
    probes: probeMarks(probes, { inside, channelY, floorY, scaleX: inside.width / measures.widthIn, scaleY }),
  };
}

/** True to scale, but neither flat nor a tower. */
function insideOf({ widthIn, heightIn }: SectionMeasures): Box {
  const width = drawingWidth - 2 * (side + wall);
  return { x: side + wall, y: headRoom + wall, width, height: Math.min(250, Math.max(180, (width * heightIn) / widthIn)) };
}

const grown = ({ x, y, width, height }: Box, by: number): Box => ({ x: x - by, y: y - by, width: width + 2 * by, height: height + 2 * by });

function laneBoxes(lanes: SectionLane[], inside: Box, floorY: number, scaleY: number): LaneBox[] {
  return lanes.map((lane, i) => {
    const before = lanes.slice(0, i).reduce((sum, { widthShare }) => sum + widthShare, 0);
    const x = inside.x + before * inside.width;
    const width = lane.widthShare * inside.width;
    const height = Math.min(lane.stackIn * scaleY, floorY - inside.y);
    return { lane, stack: { x, y: floorY - height, width, height }, centre: x + width / 2 };
  });
}

interface Frame {
  inside: Box;
  channelY: number;
  floorY: number;
  scaleX: number;
  scaleY: number;
}

function probeMarks(probes: { probe: SectionProbe; text: string }[], { inside, channelY, floorY, scaleX, scaleY }: Frame): ProbeMark[] {
  const right = inside.x + inside.width;
  const spots = probes.map(({ probe, text }) => {
    const x = inside.x + Math.min(inside.width - 6, Math.max(6, probe.xIn * scaleX));
    const width = textWidth(text, 11) + 9;
    return { probe, text, x, width, left: Math.min(right - width - 1, Math.max(inside.x + 1, x - width / 2)) };
  });
  const rows = rowsWithoutTouch(spots);
  const oneRow = rows.every((row) => row === 0);
  return spots.map(({ probe, text, x, width, left }, i) => {
    const endY = probe.distanceIn === null ? null : Math.min(floorY, channelY + probe.distanceIn * scaleY);
    const y = channelY + 9 + (rows[i] ?? 0) * (chipHeight + gap);
    // Over a full stack the line is short: its label goes below where it ends.
    const covers = oneRow && endY !== null && endY < y + chipHeight + 2;
    return { x, text, endY, chip: { x: left, y: covers ? endY + 4 : y, width, height: chipHeight } };
  });
}

/** Neighbours whose labels would touch are set in rows one under the other. */
export function rowsWithoutTouch(spots: { left: number; width: number }[]): number[] {
  const ends: number[] = [];
  const order = spots.map((_, i) => i).sort((a, b) => (spots[a]?.left ?? 0) - (spots[b]?.left ?? 0));
  const rows = spots.map(() => 0);
  for (const i of order) {
    const spot = spots[i];
    if (!spot) continue;
    const free = ends.findIndex((end) => end + gap <= spot.left);
    const row = free === -1 ? ends.length : free;
    rows[i] = row;
    ends[row] = spot.left + spot.width;
  }
  return rows;
}

/** Noto Sans semibold, on the wide side: no canvas is asked. */
export const textWidth = (text: string, size: number): number => [...text].reduce((sum, letter) => sum + (narrow.has(letter) ? 0.33 : letter === ' ' ? 0.27 : 0.61), 0) * size;
const narrow = new Set('.,:;il″’\'|()·'.split(''));
