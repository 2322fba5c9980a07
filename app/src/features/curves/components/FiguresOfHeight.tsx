import { memo } from "react";
import { StyleSheet, View } from "react-native";
import { formatAngleGradient } from "@/lib/format.ts";
import { HiddenText } from "@/ui/HiddenText.tsx";
import { Figure, Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import type { HeightFigures } from "../series/figures.ts";
import type { Reading } from "../series/panels.ts";
import { formatToeAngle } from "../series/toeDisplay.ts";
import { VerdictText } from "./VerdictText.tsx";

interface FiguresOfHeightProps {
  readonly figures: HeightFigures;
  /** What they were before; struck through where they differ as shown. */
  readonly before?: HeightFigures | null;
  readonly reading: Reading;
  readonly isChosen?: boolean;
}

/** Bump steer of one ride height in figures: how far it swings, its worst, its slope, and whether that will do. */
export const FiguresOfHeight = memo(function FiguresOfHeight(props: FiguresOfHeightProps) {
  const { figures, before, reading, isChosen } = props;
  const { height, judgement } = figures;
  const { units } = reading;
  const angle = (deg: number | null) => formatToeAngle(deg, reading);
  const gradient = (rate: number | null) => formatAngleGradient(rate, units, "always");
  return (
    <View role="group" aria-label={`Bump steer at ${height.name}`} style={styles.group}>
      <View style={styles.head}>
        <Text variant="strong" tone={isChosen ? "dye" : "ink"}>
          {height.name}
        </Text>
        {judgement ? <VerdictText judgement={judgement} units={units} /> : null}
      </View>
      <View style={styles.figures}>
        <Item
          label="Peak to peak"
          now={angle(figures.peakToPeakDeg)}
          before={before && angle(before.peakToPeakDeg)}
        />
        <Item label="Worst in band" now={angle(figures.worstDeg)} before={before && angle(before.worstDeg)} />
        <Item
          label={`Slope, ${wayOf(figures.gradientDegPerMm)}`}
          now={gradient(figures.gradientDegPerMm)}
          before={
            before && figureAlone(gradient(before.gradientDegPerMm), gradient(figures.gradientDegPerMm))
          }
        />
      </View>
    </View>
  );
});

/** What was before shares the unit of what is; the same value is the same text. */
function figureAlone(before: string, now: string): string {
  return before === now ? now : (before.split(" ")[0] ?? before);
}

/** In bump. */
function wayOf(gradient: number | null): string {
  if (gradient === null || gradient === 0) return "none";
  return gradient > 0 ? "toe-in" : "toe-out";
}

interface ItemProps {
  readonly label: string;
  readonly now: string;
  readonly before: string | null | undefined;
}

const Item = memo(function Item({ label, now, before }: ItemProps) {
  return (
    <View style={styles.item}>
      <Text variant="label" tone="inkSoft">
        {label}
      </Text>
      <View style={styles.values}>
        {before && before !== now ? (
          <Figure variant="figureSmall" tone="inkSoft" style={styles.struck}>
            <HiddenText>{"before "}</HiddenText>
            {before}
          </Figure>
        ) : null}
        <Figure>{now}</Figure>
      </View>
    </View>
  );
});

const styles = StyleSheet.create({
  group: { gap: space.xs, paddingVertical: space.s, borderTopWidth: 1, borderTopColor: color.rule },
  head: { flexDirection: "row", flexWrap: "wrap", justifyContent: "space-between", columnGap: space.m },
  figures: { flexDirection: "row", columnGap: space.m },
  item: { flex: 1, gap: space.hair, minWidth: 0 },
  values: { flexDirection: "row", alignItems: "baseline", gap: space.s, flexWrap: "wrap" },
  struck: { textDecorationLine: "line-through" },
});
