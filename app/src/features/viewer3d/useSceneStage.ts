import { type ComponentType, type LazyExoticComponent, lazy, useCallback, useMemo, useState } from "react";
import type { SceneProps } from "./scene/Scene.tsx";
import { supportsWebGl } from "./supportsWebGl.ts";

export type SceneStatus =
  | "loading"
  | "drawn"
  /** This browser has no WebGL. */
  | "unavailable"
  /** The graphics processor took its context away. */
  | "lost"
  /** The module did not arrive, or the renderer would not start. */
  | "failed";

export type SceneComponent = LazyExoticComponent<ComponentType<SceneProps>>;

/** The only dynamic import of what draws with three.js. Made anew for a retry: a lazy component keeps its failure. */
function loadScene(): SceneComponent {
  return lazy(() => import("./scene/Scene.tsx").then(({ Scene }) => ({ default: Scene })));
}

export interface SceneStage {
  readonly status: SceneStatus;
  readonly Scene: SceneComponent;
  /** Counts the retries. */
  readonly attempt: number;
  readonly tellDrawn: () => void;
  readonly tellLost: () => void;
  readonly tellFailed: () => void;
  readonly retry: () => void;
}

export function useSceneStage(): SceneStage {
  const isAble = useMemo(supportsWebGl, []);
  const [tried, setTried] = useState(() => ({ attempt: 1, Scene: loadScene() }));
  const [status, setStatus] = useState<SceneStatus>(isAble ? "loading" : "unavailable");
  const tellDrawn = useCallback(() => setStatus((last) => (last === "loading" ? "drawn" : last)), []);
  const tellLost = useCallback(() => setStatus("lost"), []);
  const tellFailed = useCallback(() => setStatus("failed"), []);
  const retry = useCallback(() => {
    setTried(({ attempt }) => ({ attempt: attempt + 1, Scene: loadScene() }));
    setStatus("loading");
  }, []);
  return { ...tried, status, tellDrawn, tellLost, tellFailed, retry };
}
