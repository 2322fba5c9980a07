import type { Axle, RideHeight, Target } from "@linkwright/kinematics";
import { steeringLock } from "@linkwright/kinematics";
import { memo, useMemo } from "react";
import { SteelRule } from "@/ui/rule/SteelRule.tsx";
import { usePose } from "../pose/PoseProvider.tsx";
import { chooseHeight, type TravelRange } from "../series/heights.ts";
import type { EarlierSweep } from "../series/panelSeries.ts";
import type { Reading } from "../series/panels.ts";
import { type HeightSweep, type Quantity, sweepHeight } from "../series/sweepHeight.ts";
import type { Earlier } from "../useLastRevision.ts";
import { CursorStage } from "./CursorStage.tsx";
import { QuantityPlot } from "./QuantityPlot.tsx";

interface CurveBoardProps {
  readonly axle: Axle;
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
  const { axle, heights, targets, range, earlier, quantities, everyHeightOf, reading, height } = props;
  const chosen = chooseHeight(
    heights,
    usePose((pose) => pose.height),
  );
  const isEvery = usePose((pose) => pose.isEveryHeight) && everyHeightOf !== undefined && heights.length > 1;
  const lock = steeringLock(axle.steering);
  const steer = usePose((pose) => Math.min(lock, Math.max(-lock, pose.steer)));
  const shown = useMemo(() => (isEvery ? heights : [chosen]), [isEvery, heights, chosen]);
  const sweeps = useMemo(
    () => shown.map((each) => sweepHeight(axle, each, range, steer)),
    [axle, shown, range, steer],
  );
  const before = useEarlierSweeps(earlier, shown, range, steer);
  const common = { targets, range, reading };
  return (
    <CursorStage range={range} units={reading.units} {...(height === undefined ? {} : { height })}>
      <Rule label={`Wheel travel about ${chosen.name}`} />
      {everyHeightOf !== undefined && isEvery
        ? sweeps.map((sweep, at) => (
            <QuantityPlot
              key={sweep.height.name}
              {...common}
              quantity={everyHeightOf}
              sweep={sweep}
              earlier={before[at] ?? NO_SWEEPS}
              title={sweep.height.name}
              minWidth={130}
            />
          ))
        : quantities.map((quantity, at) => (
            <QuantityPlot
              key={quantity}
              {...common}
              quantity={quantity}
              sweep={sweeps[0] as HeightSweep}
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

/** For each shown ride height, what was there before: at the height of that name, else at the present one. */
function useEarlierSweeps(
  earlier: readonly Earlier[],
  shown: readonly RideHeight[],
  range: TravelRange,
  steer: number,
): readonly (readonly EarlierSweep[])[] {
  return useMemo(
    () =>
      shown.map((height) =>
        earlier.map(({ label, axle, heights }) => {
          const same = heights.find(({ name }) => name === height.name) ?? height;
          return { label, sweep: sweepHeight(axle, same, range, steer) };
        }),
      ),
    [earlier, shown, range, steer],
  );
}
