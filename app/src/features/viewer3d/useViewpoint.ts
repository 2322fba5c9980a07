import { useCallback, useEffect, useLayoutEffect, useMemo, useRef, useState } from "react";
import { type Channel, createChannel } from "./channel.ts";
import {
  hasOutgrown,
  type Insets,
  placeFor,
  type Surroundings,
  type ViewName,
  zoomLimits,
} from "./viewPlaces.ts";
import { mixViewpoints, type Viewpoint, type Viewport, type ZoomLimits } from "./viewpoint.ts";

const GLIDE_MS = 280;

interface Options {
  readonly view: ViewName;
  readonly points: Surroundings["points"];
  readonly tieRod: Surroundings["tieRod"];
  readonly viewport: Viewport;
  readonly insets: Insets;
  /** False where the person prefers reduced motion: the eye then jumps. */
  readonly mayGlide: boolean;
}

export interface EyeControl {
  readonly viewpoint: Channel<Viewpoint>;
  /** The view as chosen, null once it was turned by hand. */
  readonly settled: ViewName | null;
  readonly go: (view: ViewName) => void;
  /** Back to the view last chosen. */
  readonly goBack: () => void;
  readonly move: (change: (from: Viewpoint, limits: ZoomLimits) => Viewpoint) => void;
  /** A hand takes over: nothing else moves the eye. */
  readonly takeOver: () => void;
  readonly limits: () => ZoomLimits;
}

/** Where the eye is: put there by a view, carried on by keys and hand, fitted anew with the size of the picture. */
export function useViewpoint(options: Options): EyeControl {
  const { view, points, viewport } = options;
  const latest = useRef(options);
  latest.current = options;
  const [viewpoint] = useState(() => createChannel(fitted(options, view)));
  const [settled, setSettled] = useState<ViewName | null>(view);
  const chosen = useRef(view);
  const glide = useGlide(viewpoint);

  const go = useCallback(
    (next: ViewName) => {
      chosen.current = next;
      setSettled(next);
      glide.to(fitted(latest.current, next), latest.current.mayGlide);
    },
    [glide],
  );
  const goBack = useCallback(() => go(chosen.current), [go]);
  const takeOver = useCallback(() => {
    glide.stop();
    setSettled(null);
  }, [glide]);
  const limits = useCallback(() => zoomLimits(fitted(latest.current, chosen.current)), []);
  const move = useCallback<EyeControl["move"]>(
    (change) => {
      takeOver();
      viewpoint.set(change(viewpoint.get(), limits()));
    },
    [takeOver, viewpoint, limits],
  );

  useFollowView(view, go);
  useFit({ viewpoint, viewport, points, settled, fit: () => fitted(latest.current, chosen.current) }, glide);
  return { viewpoint, settled, go, goBack, move, takeOver, limits };
}

function fitted({ points, tieRod, viewport, insets }: Options, view: ViewName): Viewpoint {
  return placeFor(view, { points, tieRod }, viewport, insets);
}

/** The view that the screen asks for, when it asks for another one. */
function useFollowView(view: ViewName, go: (view: ViewName) => void): void {
  const asked = useRef(view);
  useEffect(() => {
    if (asked.current === view) return;
    asked.current = view;
    go(view);
  }, [view, go]);
}

interface Fit {
  readonly viewpoint: Channel<Viewpoint>;
  readonly viewport: Viewport;
  readonly points: Surroundings["points"];
  readonly settled: ViewName | null;
  readonly fit: () => Viewpoint;
}

function useFit({ viewpoint, viewport, points, settled, fit }: Fit, glide: Glide): void {
  const last = useRef({ viewport, points });
  // biome-ignore lint/correctness/useExhaustiveDependencies: `fit` reads the latest of what is listed
  useLayoutEffect(() => {
    const before = last.current;
    last.current = { viewport, points };
    const isResized = before.viewport !== viewport;
    if (settled !== null) {
      const next = fit();
      const hasGrown = before.points !== points && hasOutgrown(viewpoint.get(), next, viewport);
      if (isResized || hasGrown) glide.to(next, false);
    } else if (isResized && before.viewport.height > 0) {
      const growth =
        Math.min(viewport.width, viewport.height) / Math.min(before.viewport.width, before.viewport.height);
      const now = viewpoint.get();
      viewpoint.set({ ...now, pxPerMm: now.pxPerMm * growth });
    }
  }, [viewport, points, settled, viewpoint, glide]);
}

interface Glide {
  readonly to: (end: Viewpoint, mayGlide: boolean) => void;
  readonly stop: () => void;
}

function useGlide(viewpoint: Channel<Viewpoint>): Glide {
  const frame = useRef(0);
  const glide = useMemo<Glide>(() => {
    const stop = () => cancelAnimationFrame(frame.current);
    const to = (end: Viewpoint, mayGlide: boolean) => {
      stop();
      if (!mayGlide) {
        viewpoint.set(end);
        return;
      }
      const start = viewpoint.get();
      let begun: number | null = null;
      const step = (nowMs: number) => {
        begun ??= nowMs;
        const share = Math.min(1, (nowMs - begun) / GLIDE_MS);
        viewpoint.set(share === 1 ? end : mixViewpoints(start, end, ease(share)));
        if (share < 1) frame.current = requestAnimationFrame(step);
      };
      frame.current = requestAnimationFrame(step);
    };
    return { to, stop };
  }, [viewpoint]);
  useEffect(() => glide.stop, [glide]);
  return glide;
}

function ease(share: number): number {
  return 1 - (1 - share) ** 3;
}
