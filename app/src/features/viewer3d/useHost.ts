import { type KeyboardEvent, type PointerEvent, useCallback, useRef, useState } from "react";
import type { Mark } from "./parts.ts";
import { pickMark } from "./pickMark.ts";
import type { EyeControl } from "./useViewpoint.ts";
import { orbit, pan, type Viewport, zoom } from "./viewpoint.ts";

const KEY_TURN_RAD = Math.PI / 24;
const KEY_ZOOM = 1.2;
const KEY_PAN_PX = 40;
/** Pixels a pointer may stray and still mean the mark under it. */
const CLICK_STRAY = 6;
const REACH = { mouse: 12, pen: 16, touch: 24 } as const;

interface HostOptions {
  readonly eye: EyeControl;
  readonly marks: readonly Mark[];
  readonly viewport: Viewport;
  readonly onPick: ((path: string) => void) | undefined;
}

/** Keys turn, shift and zoom the picture; a pointer that does not drag names or picks a hardpoint. */
export function useHost({ eye, marks, viewport, onPick }: HostOptions) {
  const [hovered, setHovered] = useState<string | null>(null);
  const pressed = useRef<{ x: number; y: number } | null>(null);
  const { viewpoint } = eye;

  const markUnder = useCallback(
    (event: PointerEvent<HTMLElement>): Mark | null => {
      const box = event.currentTarget.getBoundingClientRect();
      const reach =
        event.pointerType === "touch" ? REACH.touch : event.pointerType === "pen" ? REACH.pen : REACH.mouse;
      const pointer = { x: event.clientX - box.left, y: event.clientY - box.top, reach };
      return pickMark(marks, pointer, viewpoint.get(), viewport);
    },
    [marks, viewpoint, viewport],
  );

  const handlers = {
    onKeyDown: (event: KeyboardEvent<HTMLElement>) => {
      if (event.ctrlKey || event.metaKey || event.altKey) return;
      if (pressKey(event.key, event.shiftKey, eye)) event.preventDefault();
    },
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      pressed.current = event.isPrimary && event.button === 0 ? { x: event.clientX, y: event.clientY } : null;
    },
    onPointerUp: (event: PointerEvent<HTMLElement>) => {
      const start = pressed.current;
      pressed.current = null;
      if (!start || Math.hypot(event.clientX - start.x, event.clientY - start.y) > CLICK_STRAY) return;
      const mark = markUnder(event);
      if (mark) onPick?.(mark.path);
      if (event.pointerType !== "mouse") setHovered(mark?.path ?? null);
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      if (event.pointerType === "mouse" && event.buttons === 0) setHovered(markUnder(event)?.path ?? null);
    },
    onPointerLeave: (event: PointerEvent<HTMLElement>) => {
      if (event.pointerType === "mouse") setHovered(null);
    },
  };
  return { hovered, handlers };
}

/** True when the key meant something here. */
function pressKey(key: string, isShifted: boolean, { move, goBack }: EyeControl): boolean {
  const arrow = ARROWS[key];
  if (arrow) {
    const [right, up] = arrow;
    move((from) =>
      isShifted
        ? pan(from, -right * KEY_PAN_PX, -up * KEY_PAN_PX)
        : orbit(from, right * KEY_TURN_RAD, up * KEY_TURN_RAD),
    );
    return true;
  }
  if (key === "+" || key === "=") move((from, limits) => zoom(from, KEY_ZOOM, limits));
  else if (key === "-" || key === "_") move((from, limits) => zoom(from, 1 / KEY_ZOOM, limits));
  else if (key === "Home") goBack();
  else return false;
  return true;
}

/** Where the eye goes, to the viewer's right and up. */
const ARROWS: Readonly<Record<string, readonly [number, number] | undefined>> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};
