import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { formatAngle, formatNumber } from "@/lib/format.ts";
import { NumberField } from "@/ui/NumberField.tsx";
import { RuleStage } from "@/ui/rule/RuleStage.tsx";
import { SteelRule } from "@/ui/rule/SteelRule.tsx";
import { TravelPlot } from "@/ui/rule/TravelPlot.tsx";
import { Sign } from "@/ui/Sign.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { FrontView } from "./FrontView.tsx";
import { DEMO_TRAVEL, STREET_TARGET_DEG, useDemo } from "./useDemo.ts";

const formatToe = (deg: number | null) => formatAngle(deg, { decimals: 2, sign: "always" });
const formatTick = (deg: number) => formatNumber(deg, { decimals: 1, sign: "always" });
const BAND = { min: -STREET_TARGET_DEG, max: STREET_TARGET_DEG };

/** The main job in small, really solved: move the rack, watch the toe curve fall into the band. */
export function HeroDemo() {
  const [travel, setTravel] = useState(30);
  const [rackUp, setRackUp] = useState(0);
  const { units } = usePreferences();
  const isWide = useIsWide();
  const { axle, series, worstDeg } = useDemo(rackUp);
  const plot = (
    <RuleStage
      from={-DEMO_TRAVEL}
      to={DEMO_TRAVEL}
      travel={travel}
      onTravel={setTravel}
      unit={units}
      height={isWide ? 480 : 310}
    >
      <SteelRule />
      <TravelPlot
        title="Toe change"
        unitLabel="degrees"
        series={series}
        band={BAND}
        minSpan={2.4}
        include={0}
        format={formatToe}
        formatTick={formatTick}
      />
    </RuleStage>
  );
  const controls = (
    <View style={styles.controls}>
      <View style={styles.field}>
        <NumberField
          label="Rack height"
          help="+ lifts both inner joints"
          value={rackUp}
          decimals={0}
          step={1}
          unit="mm"
          sign="always"
          min={-15}
          max={20}
          onCommit={setRackUp}
        />
      </View>
      <Verdict worstDeg={worstDeg} />
    </View>
  );
  const view = <FrontView axle={axle} travel={travel} />;
  if (!isWide) {
    return (
      <View style={styles.stack}>
        {view}
        {plot}
        {controls}
      </View>
    );
  }
  return (
    <View style={styles.beside}>
      <View style={styles.plot}>{plot}</View>
      <View style={styles.picture}>
        {view}
        {controls}
      </View>
    </View>
  );
}

function Verdict({ worstDeg }: { worstDeg: number | null }) {
  const isInside = worstDeg !== null && worstDeg <= STREET_TARGET_DEG;
  return (
    <View role="status" style={styles.verdict}>
      <Text variant="figureLarge">{formatAngle(worstDeg)}</Text>
      <View style={styles.judged}>
        <Sign kind={isInside ? "ok" : "fault"} />
        <Text variant="label" tone={isInside ? "chromate" : "fault"}>
          {isInside ? "inside ±0.15°" : "outside ±0.15°: lift the rack"}
        </Text>
      </View>
      <Text variant="small" tone="inkSoft">
        worst over ±60 mm of travel
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  stack: { gap: space.l },
  beside: { flexDirection: "row", gap: space.xl, alignItems: "stretch" },
  plot: { flex: 2, minWidth: 0 },
  picture: { flex: 3, minWidth: 0, justifyContent: "space-between", gap: space.l },
  controls: {
    flexDirection: "row",
    flexWrap: "wrap",
    alignItems: "flex-end",
    gap: space.l,
    columnGap: space.xxl,
  },
  field: { width: "100%", maxWidth: 240 },
  verdict: { gap: space.hair, flexShrink: 0 },
  judged: { flexDirection: "row", alignItems: "center", gap: space.xs + 2 },
});
