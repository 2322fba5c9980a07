import type { Axle, Fault } from "@linkwright/kinematics";
import { useEffect, useRef, useState } from "react";
import { engine } from "@/workers/engine.ts";
import { type RunningEngine, startEngine } from "@/workers/engineClient.ts";
import type { NamedBand } from "./reports.ts";

/** Long enough that a drag does not start a search a frame, short enough to come with the end of it. */
const REST_MS = 120;

interface Input {
  readonly axle: Axle;
  readonly heights: readonly NamedBand[];
}

/**
 * The faults of an axle at its ride heights, found beside the main thread. Null until the first answer; later the
 * last answer stands until the next, so that a banner does not blink while one edits.
 */
export function useFaults(axle: Axle, heights: readonly NamedBand[]): readonly Fault[] | null {
  const [faults, setFaults] = useState<readonly Fault[] | null>(null);
  const searcher = useRef<FaultSearcher | null>(null);

  useEffect(() => {
    const current = createFaultSearcher(setFaults);
    searcher.current = current;
    return current.stop;
  }, []);

  useEffect(() => {
    const rest = setTimeout(() => searcher.current?.search({ axle, heights }), REST_MS);
    return () => clearTimeout(rest);
  }, [axle, heights]);

  return faults;
}

interface FaultSearcher {
  readonly search: (input: Input) => void;
  readonly stop: () => void;
}

/** One search at a time; of those that come meanwhile only the newest is kept. */
function createFaultSearcher(tell: (faults: readonly Fault[]) => void): FaultSearcher {
  let worker: RunningEngine | null = null;
  let isBusy = false;
  let isStopped = false;
  let next: Input | null = null;

  const find = async ({ axle, heights }: Input): Promise<Fault[]> => {
    try {
      worker ??= startEngine();
      return await worker.ask((there) => there.findFaults(axle, heights));
    } catch {
      // A browser that gives us no worker is no reason to keep silent about what can kill.
      return engine.findFaults(axle, heights);
    }
  };

  const work = async () => {
    isBusy = true;
    while (next !== null && !isStopped) {
      const input: Input = next;
      next = null;
      const faults = await find(input);
      if (!isStopped && next === null) tell(faults);
    }
    isBusy = false;
  };

  return {
    search: (input) => {
      next = input;
      if (!isBusy) void work();
    },
    stop: () => {
      isStopped = true;
      worker?.stop();
    },
  };
}
