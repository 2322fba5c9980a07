import { useRef } from "react";
import { StyleSheet, View } from "react-native";
import { lengthFromMm, mmFromLength, unitSymbol } from "@/lib/format.ts";
import { Choice } from "@/ui/Choice.tsx";
import { NumberField } from "@/ui/NumberField.tsx";
import { space } from "@/ui/theme/tokens.ts";
import type { Reading } from "../series/panels.ts";
import { TOE_IN_DEGREES, type ToeDisplay } from "../series/toeDisplay.ts";

interface ToeChoiceProps {
  readonly reading: Reading;
  readonly onChoose: (toe: ToeDisplay) => void;
}

/** mm: a 15-inch rim, until the person states what toe is measured across. */
const USUAL_DIAMETER = 381;
const LEAST_DIAMETER = 50;
const MOST_DIAMETER = 2000;

/** Toe as an angle, or as a length across a stated diameter. */
export function ToeChoice({ reading, onChoose }: ToeChoiceProps) {
  const { toe, units } = reading;
  const lastDiameter = useRef(USUAL_DIAMETER);
  if (toe.as === "length") lastDiameter.current = toe.diameter;
  const symbol = unitSymbol(units);
  return (
    <View style={styles.row}>
      <Choice
        label="Toe as"
        hideLabel
        compact
        value={toe.as}
        options={[
          { value: "degrees", label: "Degrees" },
          { value: "length", label: units === "inch" ? "Inches" : "Millimetres" },
        ]}
        onChange={(as) =>
          onChoose(as === "degrees" ? TOE_IN_DEGREES : { as, diameter: lastDiameter.current })
        }
      />
      {toe.as === "length" ? (
        <View style={styles.diameter}>
          <NumberField
            label="Diameter that toe is measured across"
            hideLabel
            value={lengthFromMm(toe.diameter, units)}
            decimals={units === "inch" ? 1 : 0}
            step={units === "inch" ? 0.5 : 5}
            unit={symbol}
            min={lengthFromMm(LEAST_DIAMETER, units)}
            max={lengthFromMm(MOST_DIAMETER, units)}
            onCommit={(shown) => onChoose({ as: "length", diameter: mmFromLength(shown, units) })}
          />
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", gap: space.s },
  diameter: { width: 210 },
});
