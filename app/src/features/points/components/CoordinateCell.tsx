import { type KeyboardEvent, memo } from "react";
import { StyleSheet } from "react-native";
import { DomInput, DomTableCell } from "@/ui/dom.tsx";
import { color, type } from "@/ui/theme/tokens.ts";
import type { useNumberEntry } from "@/ui/useNumberEntry.ts";

type NumberEntry = ReturnType<typeof useNumberEntry>;

interface CoordinateCellProps {
  readonly label: string;
  readonly entry: NumberEntry;
  readonly value: number;
  readonly isInvalid: boolean;
  readonly messageId: string;
  readonly isLocked: boolean;
}

const STEPS_PER_PAGE = 10;

/** One coordinate in the table: a field without steppers; arrow keys step, Page keys by ten. */
export const CoordinateCell = memo(function CoordinateCell(props: CoordinateCellProps) {
  const { label, entry, value, isInvalid, messageId, isLocked } = props;
  return (
    <DomTableCell style={styles.cell}>
      <DomInput
        role="spinbutton"
        aria-label={label}
        aria-valuenow={value}
        aria-valuetext={entry.text}
        aria-invalid={isInvalid || undefined}
        aria-describedby={isInvalid ? messageId : undefined}
        inputMode="decimal"
        autoComplete="off"
        readOnly={isLocked}
        value={entry.text}
        onChange={(event) => entry.type(event.currentTarget.value)}
        onFocus={(event) => event.currentTarget.select()}
        onBlur={entry.commit}
        onKeyDown={(event) => {
          if (!isLocked) handleKey(event, entry);
        }}
        style={[type.figureSmall, styles.input, isInvalid && styles.invalid, isLocked && styles.locked]}
      />
    </DomTableCell>
  );
});

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

const styles = StyleSheet.create({
  cell: {
    padding: 0,
    borderBottomWidth: 1,
    borderBottomStyle: "solid",
    borderBottomColor: color.rule,
  } as object,
  input: {
    width: "100%",
    minHeight: 34,
    boxSizing: "border-box",
    borderWidth: 1,
    borderStyle: "solid",
    borderColor: "transparent",
    backgroundColor: "transparent",
    color: color.ink,
    textAlign: "right",
    paddingHorizontal: 4,
    paddingVertical: 0,
    margin: 0,
  },
  invalid: { borderColor: color.fault, color: color.fault },
  locked: { cursor: "default" } as object,
});
