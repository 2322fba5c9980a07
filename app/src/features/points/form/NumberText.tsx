import type { Ref } from "react";
import { StyleSheet, View } from "react-native";
import { control } from "@/ui/controlStyles.ts";
import { DomInput } from "@/ui/dom.tsx";
import { FieldFrame } from "@/ui/FieldFrame.tsx";
import { Text } from "@/ui/Text.tsx";
import { space, type } from "@/ui/theme/tokens.ts";

interface NumberTextProps {
  readonly label: string;
  readonly help?: string | undefined;
  readonly unit: string;
  readonly isNumber: boolean;
  readonly error: string | undefined;
  readonly value: string;
  readonly onChange: (text: string) => void;
  readonly onBlur: () => void;
  readonly name: string;
  readonly ref: Ref<HTMLInputElement>;
}

/** A field of a form: what is typed stays as typed, and may be empty. */
export function NumberText({ label, help, unit, isNumber, error, onChange, ...input }: NumberTextProps) {
  return (
    <FieldFrame label={label} help={help} error={error}>
      {({ id, describedBy }) => (
        <View style={styles.row}>
          <DomInput
            {...input}
            id={id}
            inputMode={isNumber ? "decimal" : "text"}
            autoComplete="off"
            aria-describedby={describedBy}
            aria-invalid={error ? true : undefined}
            onChange={(event) => onChange(event.currentTarget.value)}
            style={[control.box, isNumber ? type.figure : type.body, error ? control.invalid : null]}
          />
          {unit ? (
            <Text variant="figureSmall" tone="inkSoft" style={styles.unit}>
              {unit}
            </Text>
          ) : null}
        </View>
      )}
    </FieldFrame>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: "row", alignItems: "center", gap: space.s },
  unit: { minWidth: 48 },
});
