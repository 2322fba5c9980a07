import { useGlobalSearchParams, useRouter } from "expo-router";
import {
  createContext,
  type ReactNode,
  useContext,
  useEffect,
  useMemo,
  useRef,
  useState,
  useSyncExternalStore,
} from "react";
import { type Pose, paramsOfPose, REST_POSE, withParams } from "./pose.ts";
import { createPoseStore, type PoseStore } from "./poseStore.ts";

const PoseContext = createContext<PoseStore | null>(null);

/** A moving cursor is written to the address once it rests: a route change a frame would stall the drag. */
const REST_MS = 300;

/** One pose for all screens of a study, kept in the address. Stands above their routes, so that it outlives a tab. */
export function PoseProvider({ children }: { children: ReactNode }) {
  const params = useGlobalSearchParams();
  const router = useRouter();
  const [store] = useState(() => createPoseStore(withParams(REST_POSE, params), requestAnimationFrame));
  const { height, heights, travel, steer, side } = params;
  const asked = useMemo(
    () => ({ height, heights, travel, steer, side }),
    [height, heights, travel, steer, side],
  );

  // Our own write coming back must not undo a move made since.
  const written = useRef<object | null>(null);

  useEffect(() => {
    if (!isSameAddress(asked, written.current)) store.change(withParams(store.get(), asked));
  }, [store, asked]);

  useEffect(() => {
    let rest: ReturnType<typeof setTimeout> | undefined;
    const write = () => {
      const wanted = paramsOfPose(store.get());
      if (isSameAddress(wanted, asked)) return;
      written.current = wanted;
      router.setParams(wanted);
    };
    const schedule = () => {
      clearTimeout(rest);
      rest = setTimeout(write, REST_MS);
    };
    schedule();
    const unsubscribe = store.subscribe(schedule);
    return () => {
      clearTimeout(rest);
      unsubscribe();
    };
  }, [store, router, asked]);

  return <PoseContext.Provider value={store}>{children}</PoseContext.Provider>;
}

function isSameAddress(a: object, b: object | null): boolean {
  return (
    b !== null && Object.entries(a).every(([name, value]) => (b as Record<string, unknown>)[name] === value)
  );
}

export function usePoseStore(): PoseStore {
  const store = useContext(PoseContext);
  if (!store) throw new Error("The pose of a study needs a PoseProvider above it.");
  return store;
}

/** Re-renders only when what is picked from the pose changes; `pick` answers a plain value. */
export function usePose<Picked extends string | number | boolean | null>(
  pick: (pose: Pose) => Picked,
): Picked {
  const store = usePoseStore();
  return useSyncExternalStore(store.subscribe, () => pick(store.get()));
}
