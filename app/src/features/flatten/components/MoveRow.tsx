import type { LengthUnit } from "@linkwright/contract";
import { type Dispatch, memo } from "react";
import { StyleSheet, View } from "react-native";
import { StepperRow } from "@/features/points/index.ts";
import { formatLength, lengthDecimals, lengthFromMm, mmFromLength, unitSymbol } from "@/lib/format.ts";
import { Checkbox } from "@/ui/Checkbox.tsx";
import { NumberField } from "@/ui/NumberField.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import type { MoveAction, MoveSetting, OfferedMove } from "../moves.ts";
import { Slide } from "./Slide.tsx";

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
          <Slide
            label={`${name}, slide`}
            value={mm}
            from={low}
            to={high}
            valueText={formatLength(mm, units, { sign: "always" })}
            onSlide={(next) => dispatch({ type: "moved", move, mm: next })}
          />
          <Bounds
            move={move}
            name={name}
            isFree={setting.isFree}
            low={low}
            high={high}
            units={units}
            step={step}
            dispatch={dispatch}
          />
        </>
      )}
    </View>
  );
});

type BoundsProps = Pick<MoveRowProps, "move" | "name" | "units" | "step" | "dispatch"> &
  Pick<MoveSetting, "isFree" | "low" | "high">;

const Bounds = memo(function Bounds(props: BoundsProps) {
  const { move, name, isFree, low, high, units, step, dispatch } = props;
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
});

const styles = StyleSheet.create({
  row: { gap: space.xs, paddingVertical: space.m, borderTopWidth: 1, borderTopColor: color.rule },
  bounds: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", columnGap: 6 },
  free: { flexGrow: 1 },
  bound: { width: 66, borderWidth: 1, borderColor: color.rule },
});
