import { useMemo } from "react";
import { StyleSheet, View } from "react-native";
import {
  type Bench,
  CurveBoard,
  HeightChoice,
  LinkagePane,
  type Reading,
  StartingTargets,
  TargetStrip,
  useLastRevision,
} from "@/features/curves/index.ts";
import { ResizablePanes } from "@/ui/ResizablePanes.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { type Place, usePlace } from "../usePlace.ts";
import { DrawingPane } from "./DrawingPane.tsx";

interface WidePointsProps {
  /** Null while the draft has never been one that can be built. */
  readonly bench: Bench | null;
  readonly reading: Reading;
}

/** Table, picture and curves side by side: what is changed in one is seen in the others at once. */
export function WidePoints({ bench, reading }: WidePointsProps) {
  const place = usePlace();
  const drawing = {
    id: "drawing",
    label: "Drawing",
    size: 26,
    minSize: 330,
    content: <DrawingPane place={place} units={reading.units} />,
  };
  if (bench === null) return drawing.content;
  const panes = [
    drawing,
    {
      id: "picture",
      label: "Linkage",
      size: 27,
      minSize: 260,
      content: <Picture bench={bench} reading={reading} place={place} />,
    },
    {
      id: "curves",
      label: "Curves",
      size: 47,
      minSize: 400,
      content: <CurvesPane bench={bench} reading={reading} />,
    },
  ];
  return (
    <View style={styles.wide}>
      <View style={styles.panes}>
        <ResizablePanes id="points" panes={panes} />
      </View>
      <TargetStrip bench={bench} reading={reading} />
    </View>
  );
}

function Picture({ bench, reading, place }: { bench: Bench; reading: Reading; place: Place }) {
  return (
    <LinkagePane
      axle={bench.axle}
      heights={bench.heights}
      units={reading.units}
      highlight={place.point}
      onPick={place.openPoint}
    />
  );
}

const QUANTITIES = ["toe", "camber", "caster"] as const;

function CurvesPane({ bench, reading }: { bench: Bench; reading: Reading }) {
  const earlier = useLastRevision();
  const board = useMemo(
    () => <CurveBoard {...bench} earlier={earlier} quantities={QUANTITIES} reading={reading} />,
    [bench, earlier, reading],
  );
  return (
    <View style={styles.curves}>
      <HeightChoice heights={bench.heights} />
      <View style={styles.board}>{board}</View>
      <StartingTargets units={reading.units} />
    </View>
  );
}

const styles = StyleSheet.create({
  wide: { flex: 1, minHeight: 0 },
  panes: { flex: 1, minHeight: 0 },
  curves: { flexGrow: 1, padding: space.l, gap: space.m },
  board: { flexGrow: 1, minHeight: 360 },
});
