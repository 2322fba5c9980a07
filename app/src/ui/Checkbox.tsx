import { type Ref, useId } from "react";
import { StyleSheet, View } from "react-native";
import { DomInput, DomLabel } from "./dom.tsx";
import { FieldError } from "./FieldFrame.tsx";
import { color, space, touch, type } from "./theme/tokens.ts";

interface CheckboxProps {
  readonly label: string;
  readonly isChecked: boolean;
  readonly onChange: (isChecked: boolean) => void;
  readonly onBlur?: () => void;
  readonly error?: string | undefined;
  readonly ref?: Ref<HTMLInputElement>;
}

export function Checkbox({ label, isChecked, onChange, onBlur, error, ref }: CheckboxProps) {
  const id = useId();
  return (
    <View>
      <DomLabel htmlFor={id} style={[type.body, styles.row]}>
        <DomInput
          ref={ref}
          id={id}
          type="checkbox"
          checked={isChecked}
          onBlur={onBlur}
          onChange={(event) => onChange(event.currentTarget.checked)}
          aria-invalid={error ? true : undefined}
          aria-describedby={error ? `${id}-error` : undefined}
          style={styles.box as object}
        />
        {label}
      </DomLabel>
      <FieldError id={`${id}-error`} message={error} />
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    display: "flex",
    flexDirection: "row",
    alignItems: "center",
    gap: space.m,
    minHeight: touch,
    color: color.ink,
    cursor: "pointer",
  },
  box: { width: 22, height: 22, margin: 0, flexShrink: 0, accentColor: color.dye } as object,
});
