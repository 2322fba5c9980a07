import { isSamePose, type Pose } from "./pose.ts";

export interface PoseStore {
  readonly get: () => Pose;
  readonly change: (change: Partial<Pose>) => void;
  /** For a pointer that moves: however often it tells, readers hear of it once a frame. */
  readonly follow: (change: Partial<Pose>) => void;
  readonly subscribe: (notify: () => void) => () => void;
}

/** Kept outside React's state, so that a moving cursor re-renders its readers and nothing above them. */
export function createPoseStore(initial: Pose, nextFrame: (act: () => void) => void): PoseStore {
  let pose = initial;
  let followed: Partial<Pose> | null = null;
  const listeners = new Set<() => void>();

  const change = (wanted: Partial<Pose>) => {
    const next = { ...pose, ...wanted };
    if (isSamePose(pose, next)) return;
    pose = next;
    for (const notify of listeners) notify();
  };
  return {
    get: () => pose,
    change: (wanted) => {
      // What was followed before comes first, or it would undo this a frame later.
      const before = followed;
      followed = null;
      change({ ...before, ...wanted });
    },
    follow: (wanted) => {
      const isAwaited = followed !== null;
      followed = { ...followed, ...wanted };
      if (isAwaited) return;
      nextFrame(() => {
        if (followed !== null) change(followed);
        followed = null;
      });
    },
    subscribe: (notify) => {
      listeners.add(notify);
      return () => listeners.delete(notify);
    },
  };
}
