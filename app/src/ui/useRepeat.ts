import { type PointerEvent, useCallback, useEffect, useRef } from "react";

const FIRST_PAUSE_MS = 400;
const NEXT_PAUSE_MS = 90;

/** Press-and-hold repeats; a single press or a key press acts once. */
export function useRepeat(act: () => void) {
  const timer = useRef<ReturnType<typeof setTimeout> | null>(null);
  const heldOnce = useRef(false);

  const stop = useCallback(() => {
    if (timer.current !== null) clearTimeout(timer.current);
    timer.current = null;
  }, []);
  useEffect(() => stop, [stop]);

  const repeat = () => {
    heldOnce.current = true;
    act();
    timer.current = setTimeout(repeat, NEXT_PAUSE_MS);
  };

  return {
    onPointerDown: (event: PointerEvent) => {
      if (event.button !== 0) return;
      heldOnce.current = false;
      stop();
      timer.current = setTimeout(repeat, FIRST_PAUSE_MS);
    },
    onPointerUp: stop,
    onPointerLeave: stop,
    onPointerCancel: stop,
    // The click that ends a hold has been acted on already.
    onClick: () => {
      if (heldOnce.current) heldOnce.current = false;
      else act();
    },
  };
}
