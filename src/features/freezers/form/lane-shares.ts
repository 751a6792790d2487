/** Shares of a freezer's width, 0 to 1 in the body of a form and percents on the screen. */
export function evenShares(lanes: number): number[] {
  const each = Math.floor(100 / lanes);
  const left = 100 - each * lanes;
  return Array.from({ length: lanes }, (_, i) => (each + (i < left ? 1 : 0)) / 100);
}

/** What was typed as percent, such as "33.5", "33,5" or "34 %"; not a number where it is none. */
export function shareOfText(text: string): number {
  const bare = text.replace('%', '').replace(',', '.').trim();
  return bare === '' ? NaN : Number(bare) / 100;
}

/** For the field: "34", "33.3". */
export const textOfShare = (share: number): string => (Number.isFinite(share) ? String(tenthsOf(share)) : '');

/** The percents of all lanes together, to a tenth; a lane without a number counts nothing. */
export const sumOfShares = (shares: number[]): number => tenthsOf(shares.reduce((sum, share) => sum + (Number.isFinite(share) ? share : 0), 0));

const tenthsOf = (share: number): number => Math.round(share * 1000) / 10;
