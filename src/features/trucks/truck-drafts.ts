import type { BodyInput, Result } from '../../../server/contract/endpoint';
import type { api } from '../../../server/contract/index';
import type { TruckRow } from '../../../server/contract/trucks';
import { dayOf } from '../../../server/domain/civil';

export interface Window {
  day: string;
  from: string;
  to: string;
}

type Told = Result<typeof api.trucks.set>;
export type Refusal = Told['refused'][number]['problem'];

/** A truck proposed to a store and not told yet. */
export interface Draft extends Window {
  /** As it was seen when the truck was proposed; a truck somebody else set since is refused. */
  row: TruckRow;
  refused: Refusal | null;
}

/** By store, in the order of their proposing. */
export type Drafts = ReadonlyMap<string, Draft>;

/** What the contract takes at once. */
const MOST = 200;

/** The usual next day of each row that has one. */
export const proposeUsual = (drafts: Drafts, rows: TruckRow[]): Drafts =>
  withAll(drafts, rows.flatMap((row) => (row.usual ? [draftOf(row, row.usual)] : [])));

export const proposeWindow = (drafts: Drafts, rows: TruckRow[], window: Window): Drafts =>
  withAll(drafts, rows.map((row) => draftOf(row, window)));

/** Another word on one draft; why the last was refused holds no longer. */
export function edit(drafts: Drafts, storeId: string, part: Partial<Window>): Drafts {
  const draft = drafts.get(storeId);
  return draft ? withAll(drafts, [{ ...draft, ...part, refused: null }]) : drafts;
}

export const takeBack = (drafts: Drafts, storeId: string): Drafts => new Map([...drafts].filter(([id]) => id !== storeId));

export type DraftFault = 'unfilled' | 'day-past' | 'window-backwards';

/** Why a draft cannot be told as it stands. */
export function faultOf({ day, from, to, row }: Draft, now: number): DraftFault | null {
  if (!day || !from || !to) return 'unfilled';
  if (day < dayOf(now, row.store.timeZone)) return 'day-past';
  return from < to ? null : 'window-backwards';
}

/** What can be told at once; the others wait for a second time. */
export const trucksOf = (drafts: Drafts, now: number): BodyInput<typeof api.trucks.set>['trucks'] =>
  [...drafts.values()]
    .filter((draft) => faultOf(draft, now) === null)
    .slice(0, MOST)
    .map(({ row, day, from, to }) => ({ storeId: row.store.id, day, from, to, version: row.truck?.version ?? null }));

/** The told are no drafts any more; the refused stay as they were typed, with the reason. */
export function settle(drafts: Drafts, { set, refused }: Told): Drafts {
  const reasons = new Map(refused.map(({ storeId, problem }) => [storeId, problem]));
  const left = [...drafts].filter(([id]) => !set.includes(id));
  return new Map(left.map(([id, draft]) => [id, { ...draft, refused: reasons.get(id) ?? draft.refused }]));
}

/** The truck a store has by now, so that telling it again replaces that one. */
export function learn(drafts: Drafts, storeId: string, truck: TruckRow['truck']): Drafts {
  const draft = drafts.get(storeId);
  return draft ? withAll(drafts, [{ ...draft, row: { ...draft.row, truck } }]) : drafts;
}

/** The rows found, after those that have drafts and were not found this time: a draft is never out of sight. */
export const shownRows = (drafts: Drafts, found: TruckRow[]): TruckRow[] => {
  const ids = new Set(found.map(({ store }) => store.id));
  return [...[...drafts.values()].map(({ row }) => row).filter(({ store }) => !ids.has(store.id)), ...found];
};

const draftOf = (row: TruckRow, { day, from, to }: Window): Draft => ({ row, day, from, to, refused: null });

const withAll = (drafts: Drafts, changed: Draft[]): Drafts => new Map([...drafts, ...changed.map((draft) => [draft.row.store.id, draft] as const)]);
