import { useDeferredValue, useMemo } from "react";
import { StyleSheet, View } from "react-native";
import {
  type Bench,
  chooseHeight,
  formatToeAngle,
  heightFigures,
  type Reading,
  usePose,
  VerdictText,
} from "@/features/curves/index.ts";
import { Figure, Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";

/** What the point being moved does to bump steer, where there is no room for the curve. */
export function BumpSteerLine({ bench, reading }: { bench: Bench; reading: Reading }) {
  const name = usePose((pose) => pose.height);
  const { axle, heights, targets } = useDeferredValue(bench);
  const height = chooseHeight(heights, name);
  const { peakToPeakDeg, judgement } = useMemo(
    () => heightFigures(axle, height, targets),
    [axle, height, targets],
  );
  return (
    <View role="group" aria-label={`Bump steer at ${height.name}`} style={styles.line}>
      <Text variant="small" tone="inkSoft">{`${height.name}, peak to peak`}</Text>
      <Figure>{formatToeAngle(peakToPeakDeg, reading)}</Figure>
      {judgement ? <VerdictText judgement={judgement} units={reading.units} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  line: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", columnGap: space.s },
});
