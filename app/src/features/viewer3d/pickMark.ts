// Which hardpoint a pointer means.

import type { Mark } from "./parts.ts";
import { projectToScreen, type Viewpoint, type Viewport, viewBasis } from "./viewpoint.ts";

export interface Pointer {
  readonly x: number;
  readonly y: number;
  /** Pixels: how far off a mark may be. A thumb needs more than a mouse. */
  readonly reach: number;
}

/** Pixels: marks closer together than this are one spot on the screen, where the one nearest to the eye is meant. */
const SAME_SPOT = 3;

export function pickMark(
  marks: readonly Mark[],
  pointer: Pointer,
  viewpoint: Viewpoint,
  viewport: Viewport,
): Mark | null {
  const basis = viewBasis(viewpoint);
  let best: { mark: Mark; distance: number; depth: number } | null = null;
  for (const mark of marks) {
    const at = projectToScreen(mark.point, viewpoint, viewport, basis);
    const distance = Math.hypot(at.x - pointer.x, at.y - pointer.y);
    if (distance > pointer.reach) continue;
    const closer = best === null || distance < best.distance - SAME_SPOT;
    const before = best !== null && distance < best.distance + SAME_SPOT && at.depth > best.depth;
    if (closer || before) best = { mark, distance, depth: at.depth };
  }
  return best?.mark ?? null;
}
