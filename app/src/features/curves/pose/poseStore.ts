import { isSamePose, type Pose } from "./pose.ts";

export interface PoseStore {
  readonly get: () => Pose;
  readonly change: (change: Partial<Pose>) => void;
  readonly subscribe: (notify: () => void) => () => void;
}

/** Kept outside React's state, so that a moving cursor re-renders its readers and nothing above them. */
export function createPoseStore(initial: Pose): PoseStore {
  let pose = initial;
  const listeners = new Set<() => void>();
  return {
    get: () => pose,
    change: (change) => {
      const next = { ...pose, ...change };
      if (isSamePose(pose, next)) return;
      pose = next;
      for (const notify of listeners) notify();
    },
    subscribe: (notify) => {
      listeners.add(notify);
      return () => listeners.delete(notify);
    },
  };
}
