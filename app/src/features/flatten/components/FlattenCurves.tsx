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
  StartingTargets,
  useLastRevision,
  usePose,
} from "@/features/curves/index.ts";
import { space } from "@/ui/theme/tokens.ts";
import type { FlattenBench } from "../useFlatten.ts";
import { LeftoverNote } from "./LeftoverNote.tsx";

interface FlattenCurvesProps {
  readonly bench: Bench;
  readonly flatten: FlattenBench;
  readonly reading: Reading;
  readonly quantities: readonly Quantity[];
  /** In pixels; without it the board takes the room there is. */
  readonly height?: number;
}

/** The curve before, faint, and after; and both in figures. */
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
      <Comparison bench={bench} flatten={flatten} reading={reading} />
      <StartingTargets units={reading.units} />
    </View>
  );
}

type ComparisonProps = Pick<FlattenCurvesProps, "bench" | "flatten" | "reading">;

/** Comes a moment later than the curve, which a drag must not wait for. */
function Comparison({ bench, flatten, reading }: ComparisonProps) {
  const { axle, heights, targets, range } = useDeferredValue(bench);
  const moved = useDeferredValue(flatten.moved);
  const before = useMemo(
    () => heights.map((height) => heightFigures(axle, height, targets)),
    [axle, heights, targets],
  );
  const figures = useMemo(
    () => (moved === axle ? before : heights.map((height) => heightFigures(moved, height, targets))),
    [moved, axle, before, heights, targets],
  );
  const chosen = chooseHeight(
    heights,
    usePose((pose) => pose.height),
  );
  const shown = figures.find(({ height }) => height === chosen);
  return (
    <View style={styles.stack}>
      <HeightsFigures axle={moved} range={range} figures={figures} before={before} reading={reading} />
      {shown ? <LeftoverNote figures={shown} reading={reading} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  fill: { flexGrow: 1, gap: space.m },
  stack: { gap: space.m },
  board: { flexGrow: 1, minHeight: 340 },
});
