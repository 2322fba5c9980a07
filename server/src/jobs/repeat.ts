// Doing something again and again until told to stop, never twice at once.

import { setTimeout as pause } from "node:timers/promises";

export interface Repeated {
  /** Resolves when what was under way is done. */
  readonly stop: () => Promise<void>;
}

export function repeat(everyMs: number, work: () => Promise<void>): Repeated {
  const stopping = new AbortController();
  const running = run(everyMs, work, stopping.signal);
  return {
    async stop() {
      stopping.abort();
      await running;
    },
  };
}

async function run(everyMs: number, work: () => Promise<void>, signal: AbortSignal): Promise<void> {
  while (!signal.aborted) {
    await work();
    await pause(everyMs, undefined, { signal }).catch(() => {});
  }
}
