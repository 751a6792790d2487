import type { Database } from '../db';
import { importReadings, type ImportCounts, type ReadingDoor } from './import-readings';
import type { Sorted } from './readings-of';

/** The pipeline every door ends in: readings become durable, then states, in one transaction per group of packs. */
export interface Pipeline {
  /** Resolves after the commit that holds the pack. */
  submit: (producerId: string, sorted: Sorted) => Promise<ImportCounts>;
  /** Everything submitted is answered; nothing more is taken. */
  stop: () => Promise<void>;
}

interface Waiting {
  producerId: string;
  sorted: Sorted;
  resolve: (counts: ImportCounts) => void;
  reject: (error: unknown) => void;
}

/** Packs that arrive within this many milliseconds share one commit, and so one sync of the disk. */
const GROUP_MS = 10;
const GROUP_MOST = 200;

export function openPipeline(db: Database, door: ReadingDoor): Pipeline {
  let waiting: Waiting[] = [];
  let timer: NodeJS.Timeout | null = null;

  const flush = () => {
    if (timer) clearTimeout(timer);
    timer = null;
    const group = waiting;
    waiting = [];
    commitGroup(db, door, group);
  };

  return {
    submit: (producerId, sorted) =>
      new Promise((resolve, reject) => {
        waiting.push({ producerId, sorted, resolve, reject });
        if (waiting.length >= GROUP_MOST) flush();
        else timer ??= setTimeout(flush, GROUP_MS);
      }),
    stop: async () => {
      if (waiting.length > 0) flush();
    },
  };
}

/** One commit for all; if that fails, one for each, so that a pack that cannot be written spoils no other. */
function commitGroup(db: Database, door: ReadingDoor, group: Waiting[]): void {
  if (group.length === 0) return;
  try {
    const counts = inTransaction(db, () => group.map(({ producerId, sorted }) => importReadings(db, door, producerId, sorted)));
    group.forEach(({ resolve }, i) => {
      const own = counts[i];
      if (own) resolve(own);
    });
  } catch (error) {
    const [only] = group;
    if (group.length === 1 && only) only.reject(error);
    else for (const one of group) commitGroup(db, door, [one]);
  }
}

const inTransaction = <T>(db: Database, work: () => T): T => db.$client.transaction(work).immediate();
