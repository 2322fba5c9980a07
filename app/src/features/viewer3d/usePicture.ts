import { type Axle, type AxleInputs, type Fault, poseAxle, type Side } from "@linkwright/kinematics";
import { useMemo, useRef } from "react";
import { buildSceneModel, type SceneModel } from "./sceneModel.ts";

interface PictureInput {
  readonly axle: Axle;
  readonly travel: Readonly<Record<Side, number>>;
  readonly steer: number;
  readonly wheelUp: number;
  readonly ghosts: readonly number[];
  readonly faults: readonly Fault[];
}

export function usePicture({ axle, travel, steer, wheelUp, ghosts, faults }: PictureInput): SceneModel {
  const { left, right } = travel;
  const ghostTravels = useSame(ghosts);
  const placements = useMemo(
    () => poseAxle(axle, { travel: { left, right }, steer, wheelUp }),
    [axle, left, right, steer, wheelUp],
  );
  const ghostPlacements = useMemo(() => {
    const inputs = ghostTravels.map(
      (at): AxleInputs => ({ travel: { left: at, right: at }, steer, wheelUp }),
    );
    return inputs.map((input) => poseAxle(axle, input));
  }, [axle, ghostTravels, steer, wheelUp]);
  return useMemo(
    () => buildSceneModel({ axle, placements, ghosts: ghostPlacements, steer, faults }),
    [axle, placements, ghostPlacements, steer, faults],
  );
}

/** A list that callers write out anew each time stays the same one while its members do. */
function useSame(list: readonly number[]): readonly number[] {
  const kept = useRef(list);
  const isSame = kept.current.length === list.length && kept.current.every((item, k) => item === list[k]);
  if (!isSame) kept.current = list;
  return kept.current;
}
