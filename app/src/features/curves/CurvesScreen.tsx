import { useMemo, useState } from "react";
import { StyleSheet, View } from "react-native";
import { ResizablePanes } from "@/ui/ResizablePanes.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { CurveBoard } from "./components/CurveBoard.tsx";
import { CurvesHead } from "./components/CurvesHead.tsx";
import { HeightsFigures } from "./components/HeightsFigures.tsx";
import { LinkagePane } from "./components/LinkagePane.tsx";
import { StartingTargets } from "./components/StartingTargets.tsx";
import { TargetStrip } from "./components/TargetStrip.tsx";
import { ToeChoice } from "./components/ToeChoice.tsx";
import { heightFigures } from "./series/figures.ts";
import type { Reading } from "./series/panels.ts";
import { QUANTITIES, type Quantity } from "./series/sweepHeight.ts";
import { useReading } from "./series/useReading.ts";
import { useAtRest } from "./useAtRest.ts";
import { type Bench, useBench } from "./useBench.ts";
import { useLastRevision } from "./useLastRevision.ts";

/** Toe change, camber, caster and track over wheel travel, beside the rule. */
export function CurvesScreen() {
  const bench = useBench();
  const isWide = useIsWide();
  // A draft that cannot be built has no curves; the study's own notice tells why and offers the way back.
  if (bench === null) return null;
  return isWide ? <WideCurves bench={bench} /> : <PhoneCurves bench={bench} />;
}

const PHONE_BOARD = 380;
const PHONE_PICTURE = 260;

function WideCurves({ bench }: { bench: Bench }) {
  const { reading, chooseToe } = useReading();
  const [quantity, setQuantity] = useState<Quantity>("toe");
  const earlier = useLastRevision();
  const { units } = reading;
  const panes = [
    {
      id: "picture",
      label: "Linkage",
      size: 34,
      minSize: 280,
      content: <LinkagePane axle={bench.axle} heights={bench.heights} units={units} />,
    },
    {
      id: "curves",
      label: "Curves",
      size: 66,
      minSize: 520,
      content: (
        <View style={styles.pane}>
          <CurvesHead
            heights={bench.heights}
            reading={reading}
            onToe={chooseToe}
            quantity={quantity}
            onQuantity={setQuantity}
          />
          <View style={styles.board}>
            <CurveBoard
              {...bench}
              earlier={earlier}
              quantities={QUANTITIES}
              everyHeightOf={quantity}
              reading={reading}
            />
          </View>
          <Below bench={bench} reading={reading} />
        </View>
      ),
    },
  ];
  return (
    <View style={styles.wide}>
      <View style={styles.panes}>
        <ResizablePanes id="curves" panes={panes} />
      </View>
      <TargetStrip bench={bench} reading={reading} />
    </View>
  );
}

function PhoneCurves({ bench }: { bench: Bench }) {
  const { reading, chooseToe } = useReading();
  const [quantity, setQuantity] = useState<Quantity>("toe");
  const earlier = useLastRevision();
  const { units } = reading;
  const quantities = useMemo(() => [quantity], [quantity]);
  return (
    <View style={styles.phone}>
      <CurvesHead heights={bench.heights} reading={reading} quantity={quantity} onQuantity={setQuantity} />
      <CurveBoard
        {...bench}
        earlier={earlier}
        quantities={quantities}
        everyHeightOf={quantity}
        reading={reading}
        height={PHONE_BOARD}
      />
      <Below bench={bench} reading={reading} />
      <ToeChoice reading={reading} onChoose={chooseToe} />
      <View style={styles.bleed}>
        <LinkagePane axle={bench.axle} heights={bench.heights} units={units} height={PHONE_PICTURE} />
      </View>
      <TargetStrip bench={bench} reading={reading} />
    </View>
  );
}

function Below({ bench, reading }: { bench: Bench; reading: Reading }) {
  const { axle, heights, targets, range } = useAtRest(bench);
  const figures = useMemo(
    () => heights.map((height) => heightFigures(axle, height, targets)),
    [axle, heights, targets],
  );
  return (
    <View style={styles.below}>
      <HeightsFigures axle={axle} range={range} figures={figures} reading={reading} />
      <StartingTargets units={reading.units} />
    </View>
  );
}

const styles = StyleSheet.create({
  wide: { flex: 1, minHeight: 0 },
  panes: { flex: 1, minHeight: 0 },
  pane: { flexGrow: 1, padding: space.l, gap: space.m },
  board: { flexGrow: 1, minHeight: 360 },
  below: { gap: space.m },
  phone: { padding: space.l, gap: space.l },
  bleed: { marginHorizontal: -space.l },
});
