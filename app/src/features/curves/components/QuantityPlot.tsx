import type { Target } from "@linkwright/kinematics";
import { memo, useMemo } from "react";
import { TravelPlot } from "@/ui/rule/TravelPlot.tsx";
import type { TravelRange } from "../series/heights.ts";
import { type EarlierSweep, panelSeries } from "../series/panelSeries.ts";
import { panelStyle, type Reading } from "../series/panels.ts";
import type { HeightSweep, Quantity } from "../series/sweepHeight.ts";
import { panelBand } from "../targets/panelBand.ts";

interface QuantityPlotProps {
  readonly quantity: Quantity;
  readonly sweep: HeightSweep;
  readonly earlier: readonly EarlierSweep[];
  readonly targets: readonly Target[];
  readonly range: TravelRange;
  readonly reading: Reading;
  /** Instead of the quantity's own name, e.g. the ride height's where several stand side by side. */
  readonly title?: string;
  readonly grow?: number;
  readonly minWidth?: number;
  /** Says which way of a signed quantity lies to the right, where there is room for it. */
  readonly roomy?: boolean;
}

/** One quantity at one ride height. Does not render anew while the cursor moves. */
export const QuantityPlot = memo(function QuantityPlot(props: QuantityPlotProps) {
  const { quantity, sweep, earlier, targets, range, reading, title, grow, minWidth, roomy } = props;
  const { toe } = reading;
  const series = useMemo(
    () => panelSeries({ sweep, quantity, toe, earlier }),
    [sweep, quantity, toe, earlier],
  );
  const style = useMemo(() => panelStyle(quantity, reading), [quantity, reading]);
  const band = useMemo(
    () =>
      // Bump steer is judged straight ahead; what the curve does at lock is shown without a verdict.
      quantity === "toe" && sweep.steer !== 0
        ? undefined
        : panelBand({ quantity, targets, height: sweep.height, range, toe }),
    [quantity, targets, sweep, range, toe],
  );
  const way = roomy && quantity === "toe" ? `${style.unitLabel}, toe-in to the right` : style.unitLabel;
  return (
    <TravelPlot
      {...style}
      title={title ?? style.title}
      unitLabel={way}
      series={series}
      band={band}
      {...(grow === undefined ? {} : { grow })}
      {...(minWidth === undefined ? {} : { minWidth })}
    />
  );
});
