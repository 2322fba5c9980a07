import type { LengthUnit } from "@linkwright/contract";
import { memo } from "react";
import { StyleSheet, View } from "react-native";
import { unitSymbol } from "@/lib/format.ts";
import { Choice } from "@/ui/Choice.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { type Step, stepsFor } from "../entry/steps.ts";

interface StepChoiceProps {
  readonly units: LengthUnit;
  readonly step: Step;
  readonly onChoose: (step: Step) => void;
}

/** How far one press of a stepper goes. */
export const StepChoice = memo(function StepChoice({ units, step, onChoose }: StepChoiceProps) {
  const steps = stepsFor(units);
  const title = `Step, ${unitSymbol(units)}`;
  return (
    <View style={styles.row}>
      <Text variant="label" tone="inkSoft">
        {title}
      </Text>
      <Choice
        label={title}
        hideLabel
        compact
        value={step.label}
        options={steps.map(({ label }) => ({ value: label, label }))}
        onChange={(label) => onChoose(steps.find((each) => each.label === label) ?? step)}
      />
    </View>
  );
});

const styles = StyleSheet.create({
  row: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", gap: space.s },
});
