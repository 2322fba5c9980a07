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
import { useIsMedium } from "@/ui/useMediaQuery.ts";
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
  const isMedium = useIsMedium();
  const { axle, series, worstDeg } = useDemo(rackUp);
  return (
    <View style={styles.demo}>
      <FrontView axle={axle} travel={travel} />
      <RuleStage
        from={-DEMO_TRAVEL}
        to={DEMO_TRAVEL}
        travel={travel}
        onTravel={setTravel}
        unit={units}
        height={isMedium ? 330 : 290}
      >
        <SteelRule />
        <TravelPlot
          title="Toe change"
          unitLabel={isMedium ? "degrees, toe-in to the right" : "degrees"}
          series={series}
          band={BAND}
          minSpan={2.4}
          include={0}
          format={formatToe}
          formatTick={formatTick}
        />
      </RuleStage>
      <View style={[styles.controls, isMedium && styles.inLine]}>
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
  demo: { gap: space.l },
  controls: { gap: space.l },
  inLine: { flexDirection: "row", alignItems: "center", gap: space.xxl },
  field: { width: "100%", maxWidth: 280 },
  verdict: { flex: 1, gap: space.hair },
  judged: { flexDirection: "row", alignItems: "center", gap: space.xs + 2 },
});
