import type { Logger } from 'pino';

/** Work that goes on after the reply was sent, such as mail: a reply's time must not tell whether there was any. */
export interface Background {
  run: (work: Promise<unknown>) => void;
  /** Resolves when all that was started has ended. */
  settled: () => Promise<void>;
}

export function createBackground(log: Logger): Background {
  const pending = new Set<Promise<unknown>>();
  return {
    run(work) {
      const guarded = work
        .catch((error: unknown) => log.error({ err: error }, 'background work failed'))
        .finally(() => pending.delete(guarded));
      pending.add(guarded);
    },
    async settled() {
      while (pending.size > 0) await Promise.all(pending);
    },
  };
}
