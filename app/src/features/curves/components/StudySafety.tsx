import { usePathname, useRouter } from "expo-router";
import { type ReactNode, useCallback } from "react";
import { type FaultPlace, FaultsProvider, SafetyBanner } from "@/features/safety/index.ts";
import { useStudy } from "@/features/study/index.ts";
import { usePoseStore } from "../pose/PoseProvider.tsx";
import { useBench } from "../useBench.ts";

/** The screens whose pictures and curves follow the pose. */
const POSED = /\/(points|curves|flatten)$/;

/** Safety faults of the open study above every one of its screens; a press leads to where one lies. */
export function StudySafety({ children }: { children: ReactNode }) {
  const { buildId, studyId } = useStudy();
  const store = usePoseStore();
  const router = useRouter();
  const isPosed = POSED.test(usePathname());
  const bench = useBench();
  const show = useCallback(
    ({ height, travel, steer }: FaultPlace) => {
      store.change({ height, travel, steer, isEveryHeight: false });
      if (isPosed) return;
      router.push({
        pathname: "/builds/[buildId]/studies/[studyId]/curves",
        params: { buildId, studyId },
      });
    },
    [store, router, isPosed, buildId, studyId],
  );
  // Nothing is known of a draft that cannot be built; the notice above the screen tells why it cannot.
  if (bench === null) return children;
  return (
    <FaultsProvider axle={bench.axle} heights={bench.heights}>
      <SafetyBanner axle={bench.axle} heights={bench.heights} onShow={show} />
      {children}
    </FaultsProvider>
  );
}
