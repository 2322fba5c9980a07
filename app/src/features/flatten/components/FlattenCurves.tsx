import { useDeferredValue, useMemo } from "react";
import { StyleSheet, View } from "react-native";
import {
  type Bench,
  CurveBoard,
  chooseHeight,
  type Earlier,
  HeightChoice,
  HeightsFigures,
  heightFigures,
  type Quantity,
  type Reading,
  useLastRevision,
  usePose,
} from "@/features/curves/index.ts";
import { space } from "@/ui/theme/tokens.ts";
import type { FlattenBench } from "../useFlatten.ts";
import { LeftoverNote } from "./LeftoverNote.tsx";

interface PartProps {
  readonly bench: Bench;
  readonly flatten: FlattenBench;
  readonly reading: Reading;
}

interface FlattenCurvesProps extends PartProps {
  readonly quantities: readonly Quantity[];
  /** In pixels; without it the board takes the room there is. */
  readonly height?: number;
}

/** The curve before, faint, and after. */
export function FlattenCurves({ bench, flatten, reading, quantities, height }: FlattenCurvesProps) {
  const { heights, targets, range } = bench;
  const { axle, moved } = flatten;
  const revision = useLastRevision();
  const earlier = useMemo<readonly Earlier[]>(
    () => (moved === axle ? revision : [{ label: "before", axle, heights }]),
    [moved, axle, heights, revision],
  );
  return (
    <View style={height === undefined ? styles.fill : styles.stack}>
      <HeightChoice heights={heights} withAll />
      <View style={height === undefined ? styles.board : null}>
        <CurveBoard
          axle={moved}
          heights={heights}
          targets={targets}
          range={range}
          earlier={earlier}
          quantities={quantities}
          everyHeightOf="toe"
          reading={reading}
          {...(height === undefined ? {} : { height })}
        />
      </View>
    </View>
  );
}

interface ComparisonProps extends PartProps {
  /** The chosen ride height alone stands beside its curve; the others may stand further down. */
  readonly of: "all" | "chosen" | "others";
}

/** Before and after in figures. Comes a moment later than the curve, which a drag must not wait for. */
export function Comparison({ bench, flatten, reading, of }: ComparisonProps) {
  const { axle, heights, targets, range } = useDeferredValue(bench);
  const moved = useDeferredValue(flatten.moved);
  const chosen = chooseHeight(
    heights,
    usePose((pose) => pose.height),
  );
  const asked = useMemo(
    () => heights.filter((height) => of === "all" || (height === chosen) === (of === "chosen")),
    [heights, chosen, of],
  );
  const before = useMemo(
    () => asked.map((height) => heightFigures(axle, height, targets)),
    [axle, asked, targets],
  );
  const figures = useMemo(
    () => (moved === axle ? before : asked.map((height) => heightFigures(moved, height, targets))),
    [moved, axle, before, asked, targets],
  );
  return <HeightsFigures axle={moved} range={range} figures={figures} before={before} reading={reading} />;
}

/** What is left at the chosen ride height. */
export function Leftover({ bench, flatten, reading }: PartProps) {
  const { heights, targets } = useDeferredValue(bench);
  const moved = useDeferredValue(flatten.moved);
  const chosen = chooseHeight(
    heights,
    usePose((pose) => pose.height),
  );
  const figures = useMemo(() => heightFigures(moved, chosen, targets), [moved, chosen, targets]);
  return <LeftoverNote figures={figures} reading={reading} />;
}

const styles = StyleSheet.create({
  fill: { flexGrow: 1, gap: space.m },
  stack: { gap: space.m },
  board: { flexGrow: 1, minHeight: 340 },
});
