import { StyleSheet, View } from "react-native";
import { NumberField } from "@/ui/NumberField.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";

type StepperRowProps = Omit<Parameters<typeof NumberField>[0], "hideLabel" | "bare" | "ref">;

/** A number with its name and help to the left and the stepper to the right: three of them on a hand's breadth. */
export function StepperRow({ label, help, ...field }: StepperRowProps) {
  return (
    <View style={styles.row}>
      <View style={styles.words} aria-hidden>
        <Text variant="strong">{label}</Text>
        {help ? (
          <Text variant="small" tone="inkSoft">
            {help}
          </Text>
        ) : null}
      </View>
      <View style={styles.field}>
        <NumberField {...field} label={help ? `${label}. ${help}` : label} hideLabel />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: "row", alignItems: "center", justifyContent: "space-between", gap: space.m },
  words: { flex: 1, minWidth: 0 },
  field: { width: 204, flexShrink: 0 },
});
