import { memo, useMemo } from "react";
import { StyleSheet, View } from "react-native";
import { Figure, Text } from "@/ui/Text.tsx";
import { type ColorName, color, space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import type { Reading } from "../series/panels.ts";
import { type Judgement, judgeTargets, type Verdict } from "../targets/judge.ts";
import { formatQuantity, quantityName } from "../targets/targetWords.ts";
import { useAtRest } from "../useAtRest.ts";
import type { Bench } from "../useBench.ts";
import { VerdictText } from "./VerdictText.tsx";

interface TargetStripProps {
  readonly bench: Bench;
  readonly reading: Reading;
}

const BAR: Readonly<Record<Verdict, ColorName>> = {
  inside: "chromate",
  below: "fault",
  above: "fault",
  unknown: "amber",
};

/** Every target with its worst value of all ride heights. Nothing where there are no targets. */
export function TargetStrip({ bench, reading }: TargetStripProps) {
  return <Tiles bench={useAtRest(bench)} reading={reading} />;
}

/** Still while what is judged has not come to rest. */
const Tiles = memo(function Tiles({ bench, reading }: TargetStripProps) {
  const { axle, heights, targets } = bench;
  const { units, words } = reading;
  const isWide = useIsWide();
  const judgements = useMemo(() => judgeTargets(axle, heights, targets), [axle, heights, targets]);
  if (judgements.length === 0) return null;
  return (
    <View role="list" aria-label="Targets" style={[styles.strip, isWide ? styles.wide : styles.stacked]}>
      {judgements.map((judgement) => (
        <View
          role="listitem"
          key={judgement.target.quantity}
          style={[styles.tile, isWide && styles.wideTile, { borderTopColor: color[BAR[judgement.verdict]] }]}
        >
          <Text variant="label" tone="inkSoft">
            {quantityName(judgement.target.quantity, words)}
          </Text>
          <View style={styles.value}>
            <Figure>{formatQuantity(judgement.target.quantity, judgement.value, units)}</Figure>
            <Text variant="small" tone="inkSoft">
              {whereOf(judgement)}
            </Text>
          </View>
          <VerdictText judgement={judgement} units={units} />
        </View>
      ))}
    </View>
  );
});

function whereOf({ height, side }: Judgement): string {
  return side === null ? height : `${height}, ${side}`;
}

const styles = StyleSheet.create({
  strip: { backgroundColor: color.panel },
  wide: {
    flexDirection: "row",
    borderTopWidth: 1,
    borderTopColor: color.rule,
    overflowX: "auto",
    flexShrink: 0,
  } as object,
  stacked: { flexDirection: "row", flexWrap: "wrap" },
  tile: {
    gap: space.hair,
    borderTopWidth: 3,
    paddingHorizontal: space.m,
    paddingVertical: space.s,
    flexGrow: 1,
    flexBasis: 160,
    borderRightWidth: 1,
    borderRightColor: color.rule,
  },
  wideTile: { minWidth: 170 },
  value: { flexDirection: "row", flexWrap: "wrap", alignItems: "baseline", columnGap: space.s },
});
