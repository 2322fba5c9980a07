import type { FlattenOutcome } from "@linkwright/kinematics";
import { useCallback, useEffect, useRef, useState } from "react";
import { type RunningEngine, startEngine } from "@/workers/engineClient.ts";
import type { Search } from "./moves.ts";

export type SearchState =
  | { readonly status: "idle" }
  | { readonly status: "busy" }
  /** The answer to this very search; `search` tells whether it still is the one asked for. */
  | { readonly status: "answered"; readonly search: Search; readonly outcome: FlattenOutcome }
  | { readonly status: "failed"; readonly error: unknown };

const IDLE: SearchState = { status: "idle" };

/**
 * Finds the flattest in a worker of its own. Cancelling ends the worker; an answer to a search that is no longer the
 * present one is dropped.
 */
export function useSearch(present: Search, onFound: (outcome: FlattenOutcome) => void) {
  const [state, setState] = useState<SearchState>(IDLE);
  const running = useRef<{ readonly engine: RunningEngine; readonly search: Search } | null>(null);
  // Read when a search begins or ends, so that the buttons need not render anew with every move.
  const latest = useRef({ present, onFound });
  latest.current = { present, onFound };

  const stop = useCallback(() => {
    running.current?.engine.stop();
    running.current = null;
  }, []);
  useEffect(() => stop, [stop]);

  // Another drawing, other bounds: what is being searched for is no longer asked.
  useEffect(() => {
    if (running.current === null || running.current.search === present) return;
    stop();
    setState(IDLE);
  }, [present, stop]);

  const cancel = useCallback(() => {
    stop();
    setState(IDLE);
  }, [stop]);

  const search = useCallback(async () => {
    stop();
    const asked = latest.current.present;
    const mine = { engine: startEngine(), search: asked };
    running.current = mine;
    setState({ status: "busy" });
    try {
      const outcome = await mine.engine.ask((there) => there.flatten(asked.axle, asked.request));
      if (running.current !== mine) return;
      setState({ status: "answered", search: asked, outcome });
      latest.current.onFound(outcome);
    } catch (error) {
      if (running.current === mine) setState({ status: "failed", error });
    } finally {
      if (running.current === mine) stop();
    }
  }, [stop]);
  const find = useCallback(() => void search(), [search]);

  return { state, find, cancel };
}
