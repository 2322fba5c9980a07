import type { LengthUnit } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { lengthDecimals, lengthFromMm, mmFromLength, unitSymbol } from "@/lib/format.ts";
import { Button } from "@/ui/Button.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { AXES, AXIS_NAMES, fieldOf, type PointRow } from "../entry/rows.ts";
import type { PointHandlers } from "./PointTableRow.tsx";
import { StepperRow } from "./StepperRow.tsx";

interface PointEditorProps extends Pick<PointHandlers, "onEnter" | "onPutBack"> {
  readonly row: PointRow;
  readonly units: LengthUnit;
  readonly step: number;
  readonly isLocked: boolean;
}

/** One hardpoint with a large stepper for each axis. */
export function PointEditor({ row, units, step, isLocked, onEnter, onPutBack }: PointEditorProps) {
  const { kept } = row;
  const told = kept && `${kept.issue.problem} ${kept.issue.hint}`;
  return (
    <View style={styles.fields}>
      {AXES.map((axis) => (
        <StepperRow
          // A draft typed into one point must not turn up in the next.
          key={fieldOf(row.path, axis)}
          label={AXIS_NAMES[axis]}
          value={lengthFromMm(row.shown[axis], units)}
          decimals={lengthDecimals(units)}
          step={step}
          unit={unitSymbol(units)}
          disabled={isLocked}
          error={kept?.field === fieldOf(row.path, axis) ? told : undefined}
          onCommit={(shown) => onEnter(row.path, axis, mmFromLength(shown, units))}
        />
      ))}
      {kept ? <Button label="Put the point back as it is drawn" onPress={() => onPutBack(row.path)} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({ fields: { gap: space.s } });
