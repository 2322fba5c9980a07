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

interface Finding extends Input {
  readonly faults: readonly Fault[];
}

/**
 * The faults of an axle at its ride heights, found beside the main thread. Until the first answer it is null; later
 * the last answer stands until the next, and `isCurrent` says whether it is still the one for this document.
 */
export function useFaults(axle: Axle, heights: readonly NamedBand[]) {
  const [finding, setFinding] = useState<Finding | null>(null);
  const searcher = useRef<FaultSearcher | null>(null);

  useEffect(() => {
    const current = createFaultSearcher(setFinding);
    searcher.current = current;
    return current.stop;
  }, []);

  useEffect(() => {
    const rest = setTimeout(() => searcher.current?.search({ axle, heights }), REST_MS);
    return () => clearTimeout(rest);
  }, [axle, heights]);

  const isCurrent = finding !== null && finding.axle === axle && finding.heights === heights;
  return { faults: finding?.faults ?? null, isCurrent };
}

interface FaultSearcher {
  readonly search: (input: Input) => void;
  readonly stop: () => void;
}

/** One search at a time; of those that come meanwhile only the newest is kept. */
function createFaultSearcher(tell: (finding: Finding) => void): FaultSearcher {
  let worker: RunningEngine | null = null;
  let isBusy = false;
  let isStopped = false;
  let next: Input | null = null;

  const find = async ({ axle, heights }: Input): Promise<Fault[]> => {
    try {
      worker ??= startEngine();
      return await worker.ask((remote) => remote.findFaults(axle, heights));
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
      if (!isStopped && next === null) tell({ ...input, faults });
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
