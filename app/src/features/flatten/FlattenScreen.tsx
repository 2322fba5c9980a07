import { useMemo } from "react";
import { StyleSheet, View } from "react-native";
import {
  type Bench,
  LinkagePane,
  StartingTargets,
  TargetStrip,
  useBench,
  useReading,
} from "@/features/curves/index.ts";
import { ResizablePanes } from "@/ui/ResizablePanes.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { Comparison, FlattenCurves, Leftover } from "./components/FlattenCurves.tsx";
import { MovesPanel } from "./components/MovesPanel.tsx";
import { SearchNotes } from "./components/SearchNotes.tsx";
import { SearchPanel } from "./components/SearchPanel.tsx";
import { type FlattenBench, useFlatten } from "./useFlatten.ts";

/** Move the rack until the toe curve is flat at every ride height. */
export function FlattenScreen() {
  const bench = useBench();
  const isWide = useIsWide();
  // A draft that cannot be built has no curve; the study's own notice tells why and offers the way back.
  if (bench === null) return null;
  return isWide ? <WideFlatten bench={bench} /> : <PhoneFlatten bench={bench} />;
}

const WIDE_QUANTITIES = ["toe", "camber", "caster"] as const;
const PHONE_QUANTITIES = ["toe"] as const;
const PHONE_BOARD = 290;

function WideFlatten({ bench }: { bench: Bench }) {
  const { reading } = useReading();
  const flatten = useFlatten(bench);
  const { moved } = flatten;
  const parts = { bench, flatten, reading };
  const movedBench = useMemo(() => ({ ...bench, axle: moved }), [bench, moved]);
  const panes = [
    {
      id: "moves",
      label: "Moves",
      size: 24,
      minSize: 320,
      content: (
        <View style={styles.side}>
          <MovesPanel bench={flatten} reading={reading} />
          <SearchNotes bench={flatten} reading={reading} />
          <View style={styles.foot}>
            <Buttons flatten={flatten} />
          </View>
        </View>
      ),
    },
    {
      id: "picture",
      label: "Linkage",
      size: 29,
      minSize: 260,
      content: (
        <LinkagePane
          axle={moved}
          heights={bench.heights}
          units={reading.units}
          highlight="left.tieRod.inner"
        />
      ),
    },
    {
      id: "curves",
      label: "Curves",
      size: 47,
      minSize: 420,
      content: (
        <View style={styles.curves}>
          <FlattenCurves {...parts} quantities={WIDE_QUANTITIES} />
          <Comparison {...parts} of="all" />
          <Leftover {...parts} />
          <StartingTargets units={reading.units} />
        </View>
      ),
    },
  ];
  return (
    <View style={styles.wide}>
      <View style={styles.panes}>
        <ResizablePanes id="flatten" panes={panes} />
      </View>
      <TargetStrip bench={movedBench} reading={reading} />
    </View>
  );
}

function PhoneFlatten({ bench }: { bench: Bench }) {
  const { reading } = useReading();
  const flatten = useFlatten(bench);
  const parts = { bench, flatten, reading };
  return (
    <View>
      <View style={styles.phone}>
        <FlattenCurves {...parts} quantities={PHONE_QUANTITIES} height={PHONE_BOARD} />
        <Comparison {...parts} of="chosen" />
        <MovesPanel bench={flatten} reading={reading} />
        <SearchNotes bench={flatten} reading={reading} />
        <Leftover {...parts} />
        <Comparison {...parts} of="others" />
        <StartingTargets units={reading.units} />
      </View>
      <View style={styles.thumb}>
        <Buttons flatten={flatten} />
      </View>
    </View>
  );
}

function Buttons({ flatten }: { flatten: FlattenBench }) {
  const { search, isMoved, isSound, putBack, apply } = flatten;
  return (
    <SearchPanel
      isBusy={search.state.status === "busy"}
      isMoved={isMoved}
      isSound={isSound}
      onFind={search.find}
      onCancel={search.cancel}
      onPutBack={putBack}
      onApply={apply}
    />
  );
}

/** The foot bar of the study's tabs, which stays in sight below. */
const FOOT_BAR = 63;

const styles = StyleSheet.create({
  wide: { flex: 1, minHeight: 0 },
  panes: { flex: 1, minHeight: 0 },
  side: { flexGrow: 1, padding: space.l, gap: space.m, backgroundColor: color.panel },
  foot: {
    position: "sticky",
    bottom: 0,
    marginTop: "auto",
    marginHorizontal: -space.l,
    marginBottom: -space.l,
    padding: space.l,
    backgroundColor: color.panel,
    borderTopWidth: 1,
    borderTopColor: color.rule,
  } as object,
  curves: { flexGrow: 1, padding: space.l, gap: space.m },
  phone: { padding: space.l, gap: space.m },
  thumb: {
    position: "sticky",
    bottom: FOOT_BAR,
    zIndex: 5,
    paddingHorizontal: space.l,
    paddingVertical: space.s,
    backgroundColor: color.panel,
    borderTopWidth: 1,
    borderTopColor: color.rule,
  } as object,
});
