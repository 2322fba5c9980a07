import type { LengthUnit } from "@linkwright/contract";
import { type Dispatch, memo } from "react";
import { StyleSheet, View } from "react-native";
import { StepperRow } from "@/features/points/index.ts";
import { formatLength, lengthDecimals, lengthFromMm, mmFromLength, unitSymbol } from "@/lib/format.ts";
import { Checkbox } from "@/ui/Checkbox.tsx";
import { DomInput } from "@/ui/dom.tsx";
import { NumberField } from "@/ui/NumberField.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import type { MoveAction, MoveSetting, OfferedMove } from "../moves.ts";

interface MoveRowProps {
  readonly move: OfferedMove;
  readonly name: string;
  readonly help: string;
  readonly setting: MoveSetting;
  /** Why the parts do not allow it; null when they do. */
  readonly whyNot: string | null;
  readonly units: LengthUnit;
  readonly step: number;
  readonly dispatch: Dispatch<MoveAction>;
}

/** mm: what the slide is read to. */
const SLIDE_GRAIN = 0.1;

/** One move: stepper and slide, and whether and how far the search may use it. */
export const MoveRow = memo(function MoveRow(props: MoveRowProps) {
  const { move, name, help, setting, whyNot, units, step, dispatch } = props;
  const { mm, low, high } = setting;
  const isBarred = whyNot !== null;
  return (
    <View role="group" aria-label={name} style={styles.row}>
      <StepperRow
        label={name}
        {...(isBarred ? {} : { help })}
        value={isBarred ? 0 : lengthFromMm(mm, units)}
        decimals={lengthDecimals(units)}
        step={step}
        sign="always"
        unit={unitSymbol(units)}
        disabled={isBarred}
        onCommit={(shown) => dispatch({ type: "moved", move, mm: mmFromLength(shown, units) })}
      />
      {isBarred ? (
        <Text variant="small" tone="inkSoft">
          {whyNot}
        </Text>
      ) : (
        <>
          <DomInput
            type="range"
            aria-label={`${name}, slide`}
            aria-valuetext={formatLength(mm, units, { sign: "always" })}
            min={low}
            max={high}
            step={SLIDE_GRAIN}
            value={mm}
            onChange={(event) => dispatch({ type: "moved", move, mm: Number(event.currentTarget.value) })}
            style={styles.slide}
          />
          <Bounds {...props} />
        </>
      )}
    </View>
  );
});

function Bounds({ move, name, setting, units, step, dispatch }: MoveRowProps) {
  const { isFree, low, high } = setting;
  const bound = (which: "low" | "high", mm: number) => (
    <View style={styles.bound}>
      <NumberField
        label={`${name}, ${which === "low" ? "lower" : "upper"} bound of the search`}
        hideLabel
        bare
        value={lengthFromMm(mm, units)}
        decimals={lengthDecimals(units)}
        step={step}
        sign="always"
        {...(which === "low" ? { max: 0 } : { min: 0 })}
        onCommit={(shown) =>
          dispatch({ type: "boundChanged", move, bound: which, mm: mmFromLength(shown, units) })
        }
      />
    </View>
  );
  return (
    <View style={styles.bounds}>
      <View style={styles.free}>
        <Checkbox
          label={isFree ? "Search from" : "Search this too"}
          isChecked={isFree}
          onChange={(next) => dispatch({ type: "freedomChanged", move, isFree: next })}
        />
      </View>
      {isFree ? (
        <>
          {bound("low", low)}
          <Text variant="small" tone="inkSoft">
            to
          </Text>
          {bound("high", high)}
          <Text variant="figureSmall" tone="inkSoft">
            {unitSymbol(units)}
          </Text>
        </>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { gap: space.xs, paddingVertical: space.m, borderTopWidth: 1, borderTopColor: color.rule },
  slide: { width: "100%", height: 32, margin: 0, accentColor: color.dye, cursor: "ew-resize" } as object,
  bounds: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", columnGap: 6 },
  free: { flexGrow: 1 },
  bound: { width: 66, borderWidth: 1, borderColor: color.rule },
});
