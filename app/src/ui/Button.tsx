import { type Ref, useRef, useState } from "react";
import { type StyleProp, StyleSheet, type ViewStyle } from "react-native";
import { DomButton } from "./dom.tsx";
import { Text } from "./Text.tsx";
import { type ColorName, color, corner, space, touch } from "./theme/tokens.ts";

export type ButtonKind = "primary" | "secondary" | "quiet" | "danger";

export interface ButtonProps {
  readonly label: string;
  readonly kind?: ButtonKind;
  /** What the button says while it works; the label otherwise. */
  readonly busyLabel?: string;
  readonly busy?: boolean;
  readonly disabled?: boolean;
  /** Needed where the label alone does not say what is acted on. */
  readonly accessibleLabel?: string;
  readonly submit?: boolean;
  /** While a returned promise is pending the button is busy, so that a second press does nothing. */
  readonly onPress?: () => unknown;
  readonly grow?: boolean;
  readonly style?: StyleProp<ViewStyle>;
  readonly expanded?: boolean;
  readonly controls?: string;
  readonly ref?: Ref<HTMLButtonElement>;
}

const LABEL_TONE: Record<ButtonKind, ColorName> = {
  primary: "onDye",
  secondary: "ink",
  quiet: "dye",
  danger: "onFault",
};

/** Runs the press and reports whether it is still running; a press meanwhile is dropped. */
function usePress(onPress: (() => unknown) | undefined) {
  const [pending, setPending] = useState(false);
  const running = useRef(false);
  const press = async () => {
    if (running.current || !onPress) return;
    const outcome = onPress();
    if (!(outcome instanceof Promise)) return;
    running.current = true;
    setPending(true);
    try {
      await outcome;
    } finally {
      running.current = false;
      setPending(false);
    }
  };
  return { pending, press };
}

export function Button({
  kind = "secondary",
  submit,
  busy,
  disabled,
  grow,
  style,
  ref,
  ...props
}: ButtonProps) {
  const { pending, press } = usePress(props.onPress);
  const isBusy = busy || pending;
  const label = isBusy ? (props.busyLabel ?? props.label) : props.label;
  return (
    <DomButton
      ref={ref}
      type={submit ? "submit" : "button"}
      className={`button button-${kind}`}
      disabled={disabled}
      aria-disabled={isBusy || undefined}
      aria-busy={isBusy || undefined}
      aria-label={props.accessibleLabel}
      aria-expanded={props.expanded}
      aria-controls={props.controls}
      onClick={(event) => {
        // A busy button keeps the focus, so it is not `disabled`; it only does nothing.
        if (isBusy) event.preventDefault();
        else if (!submit) void press();
      }}
      style={[styles.button, styles[kind], grow && styles.grow, disabled && styles.disabled, style]}
    >
      <Text variant="strong" tone={disabled ? "inkSoft" : LABEL_TONE[kind]} style={styles.label}>
        {label}
      </Text>
    </DomButton>
  );
}

const styles = StyleSheet.create({
  button: {
    minHeight: touch,
    minWidth: touch,
    paddingHorizontal: space.l,
    paddingVertical: space.s,
    alignItems: "center",
    justifyContent: "center",
    display: "flex",
    flexDirection: "row",
    borderWidth: 1,
    borderStyle: "solid",
    borderRadius: corner,
    boxSizing: "border-box",
    cursor: "pointer",
  },
  primary: { backgroundColor: color.dye, borderColor: color.dye },
  secondary: { backgroundColor: color.panel, borderColor: color.ink },
  quiet: { backgroundColor: "transparent", borderColor: "transparent" },
  danger: { backgroundColor: color.fault, borderColor: color.fault },
  disabled: { backgroundColor: color.hover, borderColor: color.rule, cursor: "auto" },
  grow: { flex: 1 },
  label: { textAlign: "center" },
});
