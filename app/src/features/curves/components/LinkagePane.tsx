import type { LengthUnit } from "@linkwright/contract";
import type { Axle, RideHeight } from "@linkwright/kinematics";
import { steeringLock } from "@linkwright/kinematics";
import { memo, useMemo } from "react";
import { StyleSheet, View } from "react-native";
import { useKnownFaults } from "@/features/safety/index.ts";
import { LinkageView } from "@/features/viewer3d/index.ts";
import { color, space } from "@/ui/theme/tokens.ts";
import { usePose } from "../pose/PoseProvider.tsx";
import { chooseHeight } from "../series/heights.ts";
import { SteerHandle } from "./SteerHandle.tsx";

interface LinkagePaneProps {
  readonly axle: Axle;
  readonly heights: readonly RideHeight[];
  readonly units: LengthUnit;
  readonly highlight?: string | null;
  readonly onPick?: (hardpoint: string) => void;
  /** In pixels; without it the picture fills its parent. */
  readonly height?: number;
  /** False leaves the steer handle out, where room is dear. */
  readonly steerable?: boolean;
}

/** The linkage as the pose has it, with the handle that steers it. */
export const LinkagePane = memo(function LinkagePane(props: LinkagePaneProps) {
  const { axle, heights, units, highlight = null, onPick, height, steerable = true } = props;
  const name = usePose((pose) => pose.height);
  const travel = usePose((pose) => pose.travel);
  const steer = usePose((pose) => pose.steer);
  const { wheelUp, band } = chooseHeight(heights, name);
  const lock = steeringLock(axle.steering);
  const hasHandle = steerable && lock > 0;
  const ghosts = useMemo(() => band.map((end) => wheelUp + end), [band, wheelUp]);
  const wheelTravel = useMemo(() => ({ left: wheelUp + travel, right: wheelUp + travel }), [wheelUp, travel]);
  const faults = useKnownFaults();
  return (
    <View style={height === undefined ? styles.fill : { height: height + (hasHandle ? HANDLE_ROOM : 0) }}>
      <View style={styles.picture}>
        <LinkageView
          axle={axle}
          travel={wheelTravel}
          steer={Math.min(lock, Math.max(-lock, steer))}
          wheelUp={wheelUp}
          highlight={highlight}
          ghosts={ghosts}
          faults={faults}
          {...(onPick && { onPick })}
        />
      </View>
      {hasHandle ? (
        <View style={styles.handle}>
          <SteerHandle axle={axle} units={units} />
        </View>
      ) : null}
    </View>
  );
});

/** Pixels that the steer handle takes below the picture. */
const HANDLE_ROOM = 96;

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0 },
  picture: { flex: 1, minHeight: 0 },
  handle: {
    paddingHorizontal: space.l,
    paddingVertical: space.s,
    backgroundColor: color.panel,
    borderTopWidth: 1,
    borderTopColor: color.rule,
  },
});
