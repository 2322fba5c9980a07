import { StyleSheet, View } from "react-native";
import { control } from "./controlStyles.ts";
import { DomSelect } from "./dom.tsx";
import { FieldFrame, type FieldFrameProps } from "./FieldFrame.tsx";
import { color, space } from "./theme/tokens.ts";

export interface Option<Value extends string> {
  readonly value: Value;
  readonly label: string;
}

interface SelectProps<Value extends string> extends FieldFrameProps {
  readonly value: Value;
  readonly options: readonly Option<Value>[];
  readonly onChange: (value: Value) => void;
  readonly disabled?: boolean;
}

/** The platform's own list: the best there is under a thumb and for a screen reader. */
export function Select<Value extends string>({
  label,
  help,
  error,
  hideLabel,
  value,
  options,
  onChange,
  disabled,
}: SelectProps<Value>) {
  return (
    <FieldFrame label={label} help={help} error={error} hideLabel={hideLabel}>
      {({ id, describedBy }) => (
        <View>
          <DomSelect
            id={id}
            value={value}
            disabled={disabled}
            aria-describedby={describedBy}
            aria-invalid={error ? true : undefined}
            onChange={(event) => {
              const chosen = options.find((option) => option.value === event.currentTarget.value);
              if (chosen) onChange(chosen.value);
            }}
            style={[control.box, control.text, styles.select, disabled ? control.locked : null]}
          >
            {options.map((option) => (
              <option key={option.value} value={option.value}>
                {option.label}
              </option>
            ))}
          </DomSelect>
          <svg
            aria-hidden="true"
            width="12"
            height="8"
            viewBox="0 0 12 8"
            style={{ position: "absolute", right: 14, top: 19, pointerEvents: "none" }}
          >
            <path d="M1 1.5 6 6.5 11 1.5" fill="none" stroke={color.ink} strokeWidth="1.8" />
          </svg>
        </View>
      )}
    </FieldFrame>
  );
}

const styles = StyleSheet.create({
  select: {
    appearance: "none",
    paddingRight: space.xxl,
    cursor: "pointer",
    textOverflow: "ellipsis",
  } as object,
});
