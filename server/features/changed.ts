import { isDeepStrictEqual } from 'node:util';
import type { ProblemType } from '../contract/problem';
import { problem } from '../http/problem';

/** What of a body differs from what is stored; whoever saw another version is told so first. */
export function changedOf<B extends { version: number }>(stored: Record<keyof B, unknown>, body: B): Partial<Omit<B, 'version'>> {
  if (stored.version !== body.version) throw problem('changed-meanwhile');
  const differs = ([name, value]: [string, unknown]) => value !== undefined && !isDeepStrictEqual(value, stored[name as keyof B]);
  // Some of the body's own entries; the version is the same, so it is none of them.
  return Object.fromEntries(Object.entries(body).filter(differs)) as Partial<Omit<B, 'version'>>;
}

/** A value that only one may have: who asks for what another has is told at its field. */
export function refuseTaken(pointer: string, holder: { id: string } | undefined, own?: string): void {
  if (holder && holder.id !== own) throw problem('bad-input', undefined, [{ pointer, fault: 'taken' }]);
}

/** Something new can only be tied to what is there and in use. */
export function inUse<T extends { retiredAt: number | null }>(row: T | undefined, type: ProblemType = 'place-unknown'): T {
  if (!row || row.retiredAt !== null) throw problem(type);
  return row;
}

/** For an update's patch: nothing where nothing was said of it. */
export const retiredAtOf = (retired: boolean | undefined, now: number): number | null | undefined =>
  retired === undefined ? undefined : retired ? now : null;
