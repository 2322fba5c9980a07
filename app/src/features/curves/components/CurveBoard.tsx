import type { Axle, RideHeight, Target } from "@linkwright/kinematics";
import { steeringLock } from "@linkwright/kinematics";
import { memo, useMemo, useState } from "react";
import { isSameJson } from "@/lib/json.ts";
import { SteelRule } from "@/ui/rule/SteelRule.tsx";
import { usePose } from "../pose/PoseProvider.tsx";
import { chooseHeight, type TravelRange } from "../series/heights.ts";
import type { EarlierSweep } from "../series/panelSeries.ts";
import type { Reading } from "../series/panels.ts";
import { createSweeper } from "../series/sweepCache.ts";
import type { HeightSweep, Quantity } from "../series/sweepHeight.ts";
import { useAtRest } from "../useAtRest.ts";
import type { Earlier } from "../useLastRevision.ts";
import { CursorStage } from "./CursorStage.tsx";
import { QuantityPlot } from "./QuantityPlot.tsx";

interface CurveBoardProps {
  readonly axle: Axle;
  /** What all quantities but the first are solved from, where they need not follow every frame of a drag. */
  readonly restedAxle?: Axle;
  readonly heights: readonly RideHeight[];
  readonly targets: readonly Target[];
  readonly range: TravelRange;
  readonly earlier: readonly Earlier[];
  /** At the chosen ride height, the first one widest. */
  readonly quantities: readonly Quantity[];
  /** Shown once for every ride height when the person asks for all of them; without it, all is not on offer. */
  readonly everyHeightOf?: Quantity;
  readonly reading: Reading;
  /** In pixels; without it the board fills its parent. */
  readonly height?: number;
}

/** The steel rule and the curves beside it, solved once for a document, a ride height and a steer. */
export function CurveBoard(props: CurveBoardProps) {
  const { axle, heights, targets, range, restedAxle, quantities, everyHeightOf, reading, height } = props;
  const chosen = chooseHeight(
    heights,
    usePose((pose) => pose.height),
  );
  const isEvery = usePose((pose) => pose.isEveryHeight) && everyHeightOf !== undefined && heights.length > 1;
  const lock = steeringLock(axle.steering);
  const steer = usePose((pose) => Math.min(lock, Math.max(-lock, pose.steer)));
  const shown = useMemo(() => (isEvery ? heights : [chosen]), [isEvery, heights, chosen]);
  const [sweep] = useState(createSweeper);
  const sweeps = useMemo(
    () => shown.map((each) => sweep(axle, each, range, steer)),
    [sweep, axle, shown, range, steer],
  );
  const rested = useMemo(
    () => sweep(restedAxle ?? axle, chosen, range, steer),
    [sweep, restedAxle, axle, chosen, range, steer],
  );
  const earlier = useOtherDrawings(props.earlier, restedAxle ?? axle, heights);
  // What is past follows when the hand rests.
  const restedSteer = useAtRest(steer);
  const before = useMemo(
    () =>
      shown.map((each) => earlierSweeps(earlier, each, (...asked) => sweep(...asked, range, restedSteer))),
    [sweep, earlier, shown, range, restedSteer],
  );
  const common = { targets, range, reading };
  return (
    <CursorStage range={range} units={reading.units} {...(height === undefined ? {} : { height })}>
      <Rule label={`Wheel travel about ${chosen.name}`} />
      {everyHeightOf !== undefined && isEvery
        ? sweeps.map((each, at) => (
            <QuantityPlot
              key={each.height.name}
              {...common}
              quantity={everyHeightOf}
              sweep={each}
              earlier={before[at] ?? NO_SWEEPS}
              title={each.height.name}
              minWidth={130}
            />
          ))
        : quantities.map((quantity, at) => (
            <QuantityPlot
              key={quantity}
              {...common}
              quantity={quantity}
              sweep={(at > 0 ? rested : sweeps[0]) as HeightSweep}
              earlier={before[0] ?? NO_SWEEPS}
              grow={at === 0 ? 1.5 : 1}
              minWidth={at === 0 ? 150 : 104}
              roomy={at === 0}
            />
          ))}
    </CursorStage>
  );
}

/** Still while curves change beside it; its own cursor reaches it past this. */
const Rule = memo(SteelRule);

const NO_SWEEPS: readonly EarlierSweep[] = [];

/** Those that say something else than the present drawing: an equal one would be solved for nothing. */
function useOtherDrawings(
  earlier: readonly Earlier[],
  axle: Axle,
  heights: readonly RideHeight[],
): readonly Earlier[] {
  return useMemo(() => {
    const others = earlier.filter(
      (each) => !(isSameJson(each.axle, axle) && isSameJson(each.heights, heights)),
    );
    return others.length === earlier.length ? earlier : others;
  }, [earlier, axle, heights]);
}

/** What was there before: at the ride height of that name, else at the present one. */
function earlierSweeps(
  earlier: readonly Earlier[],
  height: RideHeight,
  sweep: (axle: Axle, height: RideHeight) => HeightSweep,
): readonly EarlierSweep[] {
  return earlier.map(({ label, axle, heights }) => ({
    label,
    sweep: sweep(axle, heights.find(({ name }) => name === height.name) ?? height),
  }));
}
