// Which changes belong together: a stepper that is held or pressed again and again is undone in one step.

export interface Gesture {
  readonly id: string;
  readonly field: string;
  readonly atMs: number;
}

export const NO_GESTURE: Gesture = { id: "0", field: "", atMs: Number.NEGATIVE_INFINITY };

/** A pause longer than this begins a new gesture; a held stepper repeats many times within it. */
const PAUSE_MS = 900;

export function nextGesture(last: Gesture, field: string, atMs: number): Gesture {
  const isSame = last.field === field && atMs - last.atMs < PAUSE_MS;
  return { id: isSame ? last.id : String(Number(last.id) + 1), field, atMs };
}
