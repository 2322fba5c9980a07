import { useId } from "react";
import { StyleSheet, View } from "react-native";
import { DomInput, DomLabel } from "./dom.tsx";
import type { Option } from "./Select.tsx";
import { Text } from "./Text.tsx";
import { color, corner, space, touch, type } from "./theme/tokens.ts";

interface ChoiceProps<Value extends string> {
  readonly label: string;
  readonly hideLabel?: boolean;
  readonly value: Value;
  readonly options: readonly Option<Value>[];
  readonly onChange: (value: Value) => void;
  readonly compact?: boolean;
}

/** A few alternatives side by side; radio buttons underneath, so arrow keys move between them. */
export function Choice<Value extends string>({
  label,
  hideLabel,
  value,
  options,
  onChange,
  compact,
}: ChoiceProps<Value>) {
  const name = useId();
  return (
    <View role="radiogroup" aria-label={label} style={styles.group}>
      {hideLabel ? null : <Text variant="strong">{label}</Text>}
      <View style={[styles.row, compact && styles.compact]}>
        {options.map((option, index) => {
          const isChosen = option.value === value;
          return (
            <DomLabel
              key={option.value}
              className="choice"
              style={[
                compact ? type.small : type.body,
                styles.option,
                compact && styles.compactOption,
                index > 0 && styles.divided,
                isChosen && styles.chosen,
              ]}
            >
              <DomInput
                type="radio"
                className="visually-hidden"
                name={name}
                checked={isChosen}
                onChange={() => onChange(option.value)}
              />
              {option.label}
            </DomLabel>
          );
        })}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  group: { gap: space.xs },
  row: {
    flexDirection: "row",
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: corner,
    overflow: "hidden",
    backgroundColor: color.panel,
  },
  compact: { alignSelf: "flex-start" },
  option: {
    flex: 1,
    minHeight: touch,
    minWidth: touch,
    display: "flex",
    alignItems: "center",
    justifyContent: "center",
    textAlign: "center",
    paddingHorizontal: space.m,
    color: color.ink,
    cursor: "pointer",
    boxSizing: "border-box",
    position: "relative",
  } as object,
  compactOption: { flexBasis: "auto", flexShrink: 0, whiteSpace: "nowrap" } as object,
  divided: { borderLeftWidth: 1, borderLeftStyle: "solid", borderLeftColor: color.rule } as object,
  chosen: { backgroundColor: color.dye, color: color.onDye, fontWeight: "600" },
});
