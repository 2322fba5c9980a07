// Ending a program when it is asked to.

import { describeError, type Log } from "./log.ts";

/** On SIGTERM or SIGINT: `stop`, then exit; exit with a failure when that takes longer than `withinMs`. */
export function onStopSignal(log: Log, withinMs: number, stop: () => Promise<void>): void {
  let isStopping = false;
  const end = (signal: NodeJS.Signals) => {
    if (isStopping) return;
    isStopping = true;
    log.info("stopping", { signal });
    setTimeout(() => {
      log.error("did not stop in time", { withinMs });
      process.exit(1);
    }, withinMs).unref();
    stop().then(
      () => process.exit(0),
      (error: unknown) => {
        log.error("did not stop cleanly", describeError(error));
        process.exit(1);
      },
    );
  };
  process.on("SIGTERM", end);
  process.on("SIGINT", end);
}
