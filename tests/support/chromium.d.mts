export const chromiumFlags: string[];
export function findChromium(): string | null;
export function ensureChromium(): string;
