import type { Logger } from 'pino';

export interface Job {
  /** Resolves when the round under way is over. */
  stop: () => Promise<void>;
}

/** Runs a round, waits, runs the next: never two at once; a failed round is logged and the next one comes. */
export function every(ms: number, log: Logger, round: () => Promise<void>): Job {
  let timer: NodeJS.Timeout | null = null;
  let stopped = false;
  const run = async (): Promise<void> => {
    try {
      await round();
    } catch (error) {
      log.error({ err: error }, 'job failed');
    }
    if (!stopped) timer = setTimeout(() => (current = run()), ms);
  };
  let current = run();
  return {
    stop: async () => {
      stopped = true;
      if (timer) clearTimeout(timer);
      await current;
    },
  };
}
