import type { Box } from './section-geometry';

/** Smaller bags than these blur into a tint. */
const least = { width: 9, height: 6.5 };
/** A bag lies: about half again as wide as it is high. */
const proportion = 1.5;

/**
 * The outlines of as many bags as the lane holds, in full rows that reach the measured height exactly. Where they would
 * be too small to see, fewer are drawn at the same height. A bag's size follows from the count, so that big bags look big.
 */
export function bagOutlines(bags: number, { x, y, width, height }: Box): string {
  if (bags < 1 || height < 3) return '';
  const rowsThatFit = Math.max(1, Math.floor(height / least.height));
  const acrossThatFit = Math.max(1, Math.floor(width / least.width));
  const count = Math.min(bags, rowsThatFit * acrossThatFit);
  const ideal = Math.sqrt((count * height * proportion) / width);
  const rows = Math.min(rowsThatFit, count, Math.max(1, Math.ceil(count / acrossThatFit), Math.round(ideal)));
  const rowHeight = height / rows;
  return Array.from({ length: rows }, (_, row) => {
    // What does not divide evenly lies in the lower rows.
    const across = Math.floor(count / rows) + (row < count % rows ? 1 : 0);
    const bagWidth = width / across;
    const top = y + height - (row + 1) * rowHeight;
    return Array.from({ length: across }, (_, i) => bag({ x: x + i * bagWidth, y: top, width: bagWidth, height: rowHeight })).join('');
  }).join('');
}

/** How many bags an outline draws. */
export const bagsDrawn = (outline: string): number => outline.split('M').length - 1;

function bag(cell: Box): string {
  const x = cell.x + 1;
  const y = cell.y + 0.7;
  const w = cell.width - 2;
  const h = cell.height - 1.4;
  const r = Math.min(6, h / 2.4, w / 2.4);
  const n = (value: number) => value.toFixed(1);
  return `M${n(x + r)} ${n(y)}h${n(w - 2 * r)}a${n(r)} ${n(r)} 0 0 1 ${n(r)} ${n(r)}v${n(h - 2 * r)}a${n(r)} ${n(r)} 0 0 1 ${n(-r)} ${n(r)}h${n(2 * r - w)}a${n(r)} ${n(r)} 0 0 1 ${n(-r)} ${n(-r)}v${n(2 * r - h)}a${n(r)} ${n(r)} 0 0 1 ${n(r)} ${n(-r)}z`;
}
