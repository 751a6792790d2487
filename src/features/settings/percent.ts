/** A share as it is entered: 0.25 is "25". What is no number stays what was typed. */
export const percentText = (share: unknown): string => (typeof share === 'number' ? String(Math.round(share * 1000) / 10) : String(share ?? ''));

/** "25" or "25 %" is 0.25; what is no number is left for the contract to refuse. */
export function shareOf(text: string): number | string {
  const number = Number(text.replace('%', '').replace(',', '.').trim() || NaN);
  return Number.isFinite(number) ? Math.round(number * 10) / 1000 : text;
}
