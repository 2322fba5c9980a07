import type { KeyboardEvent, Ref } from "react";
import { StyleSheet, View } from "react-native";
import { control } from "./controlStyles.ts";
import { DomInput } from "./dom.tsx";
import { FieldFrame, type FieldFrameProps } from "./FieldFrame.tsx";
import { StepButton } from "./StepButton.tsx";
import { Text } from "./Text.tsx";
import { color, corner, space, touch, type } from "./theme/tokens.ts";
import { useMediaQuery } from "./useMediaQuery.ts";
import { type NumberEntryOptions, useNumberEntry } from "./useNumberEntry.ts";

interface NumberFieldProps extends FieldFrameProps, NumberEntryOptions {
  /** Without ± buttons, for dense tables on wide screens; arrow keys still step. */
  readonly bare?: boolean;
  readonly disabled?: boolean;
  readonly ref?: Ref<HTMLInputElement>;
}

const STEPS_PER_PAGE = 10;

type NumberEntry = ReturnType<typeof useNumberEntry>;

function handleKey(event: KeyboardEvent, entry: NumberEntry) {
  const steps: Record<string, number> = {
    ArrowUp: 1,
    ArrowDown: -1,
    PageUp: STEPS_PER_PAGE,
    PageDown: -STEPS_PER_PAGE,
  };
  const count = steps[event.key];
  if (count !== undefined) {
    event.preventDefault();
    entry.stepBy(event.shiftKey ? count * STEPS_PER_PAGE : count);
  } else if (event.key === "Enter") entry.commit();
  else if (event.key === "Escape") entry.revert();
}

/** A number with ± steppers of a chosen step; takes comma or point and never throws away what was typed. */
export function NumberField({
  label,
  help,
  error,
  hideLabel,
  bare,
  disabled,
  ref,
  ...options
}: NumberFieldProps) {
  const entry = useNumberEntry(options);
  // The numeric pad of some phones has no minus, so signed fields bring their own.
  const needsSignKey = useMediaQuery("(pointer: coarse)") && (options.min === undefined || options.min < 0);
  const message = entry.message ?? error;
  const stepText = `${options.step} ${options.unit ?? ""}`.trim();
  return (
    <FieldFrame label={label} help={help} error={message} hideLabel={hideLabel}>
      {({ id, describedBy }) => (
        <View style={[styles.row, bare && styles.bareRow, message ? control.invalid : null]}>
          {bare ? null : (
            <StepButton
              sign="−"
              label={`${label}: ${stepText} less`}
              disabled={disabled}
              onStep={() => entry.stepBy(-1)}
            />
          )}
          <View style={styles.middle}>
            <DomInput
              ref={ref}
              id={id}
              inputMode="decimal"
              autoComplete="off"
              role="spinbutton"
              aria-valuenow={options.value ?? undefined}
              aria-valuetext={
                options.value === null ? undefined : `${entry.text} ${options.unit ?? ""}`.trim()
              }
              aria-valuemin={options.min}
              aria-valuemax={options.max}
              aria-describedby={describedBy}
              aria-invalid={message ? true : undefined}
              disabled={disabled}
              value={entry.text}
              onChange={(event) => entry.type(event.currentTarget.value)}
              onFocus={(event) => event.currentTarget.select()}
              onBlur={entry.commit}
              onKeyDown={(event) => handleKey(event, entry)}
              style={[type.figure, styles.input, bare && styles.bareInput, disabled ? styles.locked : null]}
            />
            {options.unit && !bare ? (
              <Text variant="figureSmall" tone="inkSoft" aria-hidden style={styles.unit}>
                {options.unit}
              </Text>
            ) : null}
          </View>
          {needsSignKey ? (
            <StepButton
              sign="±"
              label={`${label}: change the sign`}
              disabled={disabled}
              onStep={entry.flipSign}
            />
          ) : null}
          {bare ? null : (
            <StepButton
              sign="+"
              label={`${label}: ${stepText} more`}
              disabled={disabled}
              onStep={() => entry.stepBy(1)}
            />
          )}
        </View>
      )}
    </FieldFrame>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: "row",
    borderWidth: 1,
    borderColor: color.edge,
    borderRadius: corner,
    backgroundColor: color.panel,
  },
  bareRow: { borderColor: "transparent", backgroundColor: "transparent" },
  middle: { flex: 1, flexDirection: "row", alignItems: "center", minWidth: 0 },
  input: {
    flex: 1,
    minWidth: 0,
    minHeight: touch,
    borderWidth: 0,
    backgroundColor: "transparent",
    color: color.ink,
    textAlign: "center",
    padding: space.xs,
  },
  bareInput: { textAlign: "right", minHeight: 30, padding: 2 },
  locked: { color: color.inkSoft },
  unit: { paddingRight: space.s },
});
