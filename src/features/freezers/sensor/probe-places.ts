/** Where probes hang when they share the width evenly: each in the middle of its part, to a tenth of an inch. */
export const evenPlaces = (probes: number, insideWidthIn: number): number[] =>
  Array.from({ length: probes }, (_, i) => Math.round(((2 * i + 1) / (2 * probes)) * insideWidthIn * 10) / 10);
