import { useRef } from "react";
import { StyleSheet } from "react-native";
import { DomButton } from "./dom.tsx";
import { color, touch, type } from "./theme/tokens.ts";
import { useRepeat } from "./useRepeat.ts";

interface StepButtonProps {
  readonly sign: "−" | "+" | "±";
  readonly label: string;
  readonly disabled: boolean | undefined;
  readonly onStep: () => void;
}

/** One end of a number field: a press steps, holding repeats. */
export function StepButton({ sign, label, disabled, onStep }: StepButtonProps) {
  const latest = useRef(onStep);
  latest.current = onStep;
  const repeat = useRepeat(() => latest.current());
  return (
    <DomButton
      className="stepper"
      aria-label={label}
      disabled={disabled}
      {...(sign === "±" ? { onClick: onStep } : repeat)}
      style={[type.section, styles.stepper, sign === "−" ? styles.dividedRight : styles.dividedLeft]}
    >
      {sign}
    </DomButton>
  );
}

const styles = StyleSheet.create({
  stepper: {
    width: touch,
    minHeight: touch,
    borderWidth: 0,
    borderStyle: "solid",
    borderColor: color.rule,
    backgroundColor: "transparent",
    color: color.ink,
    cursor: "pointer",
    padding: 0,
    userSelect: "none",
    touchAction: "manipulation",
  } as object,
  dividedRight: { borderRightWidth: 1 },
  dividedLeft: { borderLeftWidth: 1 },
});
