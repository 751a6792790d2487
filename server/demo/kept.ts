import { existsSync, readFileSync, renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import type { Memory } from './simulation';

interface Kept {
  slug: string;
  key: string;
  memory: Memory;
}

const fileIn = (dataDir: string): string => path.join(dataDir, 'simulator.json');

/** What the simulator was told to keep between runs, by producer. */
export function kept(dataDir: string): Map<string, Kept> {
  if (!existsSync(fileIn(dataDir))) return new Map();
  // Written by `keep` below and by nothing else.
  const { producers } = JSON.parse(readFileSync(fileIn(dataDir), 'utf8')) as { producers: Kept[] };
  return new Map(producers.map((one) => [one.slug, one]));
}

/** Written beside and renamed, so that a demo stopped in the middle still has the last one. */
export function keep(dataDir: string, played: { demo: { slug: string }; key: string; memory: Memory }[]): void {
  const producers: Kept[] = played.map(({ demo, key, memory }) => ({ slug: demo.slug, key, memory }));
  const beside = `${fileIn(dataDir)}.part`;
  writeFileSync(beside, JSON.stringify({ producers }), { mode: 0o600 });
  renameSync(beside, fileIn(dataDir));
}
