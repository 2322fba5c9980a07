import { useMemo } from "react";
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
  useAtRest,
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
  const isDrawn = moved === axle;
  // The moves offered change toe and hardly anything else.
  const rested = useAtRest(moved);
  const revision = useLastRevision();
  const earlier = useMemo<readonly Earlier[]>(
    () => (isDrawn ? revision : [{ label: "before", axle, heights }]),
    [isDrawn, axle, heights, revision],
  );
  return (
    <View style={height === undefined ? styles.fill : styles.stack}>
      <HeightChoice heights={heights} withAll />
      <View style={height === undefined ? styles.board : null}>
        <CurveBoard
          axle={moved}
          restedAxle={rested}
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

/**
 * Before and after in figures. Those of the chosen ride height follow its curve; the others come once a drag rests,
 * so as not to slow it.
 */
export function Comparison({ bench, flatten, reading, of }: ComparisonProps) {
  const { axle, heights, targets, range } = bench;
  const { moved } = flatten;
  const rested = useAtRest(moved);
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
  const atRest = useMemo(
    () => asked.map((height) => heightFigures(rested, height, targets)),
    [rested, asked, targets],
  );
  const figures = useMemo(
    () => atRest.map((each) => (each.height === chosen ? heightFigures(moved, chosen, targets) : each)),
    [atRest, chosen, moved, targets],
  );
  return <HeightsFigures axle={rested} range={range} figures={figures} before={before} reading={reading} />;
}

/** What is left at the chosen ride height, once a drag rests. */
export function Leftover({ bench, flatten, reading }: PartProps) {
  const { heights, targets } = bench;
  const moved = useAtRest(flatten.moved);
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
