// Starting, asking and stopping an engine in a worker of its own. Stopping ends whatever it was at.

import { releaseProxy, wrap } from "comlink";
import type { Engine } from "./engine.ts";

export interface RunningEngine {
  /** Rejects when the worker cannot be loaded or dies; never settles once it has been stopped. */
  readonly ask: <Answer>(question: (engine: Engine) => Promise<Answer>) => Promise<Answer>;
  readonly stop: () => void;
}

export function startEngine(): RunningEngine {
  // Metro finds the worker by this very form of words.
  const worker = new Worker(new URL("./engine.worker.ts", import.meta.url));
  const remote = wrap<Engine>(worker);
  const failed = new Promise<never>((_, reject) => {
    worker.addEventListener("error", (event) => reject(new Error(event.message || "The worker failed.")));
  });
  // Whoever asks hears of it; with nobody asking, it is no unhandled rejection.
  failed.catch(() => undefined);
  return {
    // The engine's functions all answer by promise, so from here they look as they are; comlink's own types take
    // an answer that is a union apart.
    ask: (question) => Promise.race([question(remote as unknown as Engine), failed]),
    stop: () => {
      remote[releaseProxy]();
      worker.terminate();
    },
  };
}
