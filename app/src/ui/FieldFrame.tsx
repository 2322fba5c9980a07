import { type ReactNode, useId } from "react";
import { StyleSheet, View } from "react-native";
import { DomLabel } from "./dom.tsx";
import { Sign } from "./Sign.tsx";
import { Text } from "./Text.tsx";
import { color, space, type } from "./theme/tokens.ts";

export interface FieldFrameProps {
  readonly label: string;
  /** What to enter, in a line; stands under the label. */
  readonly help?: string | undefined;
  readonly error?: string | undefined;
  /** For tables, where the row and column heads are the visible label. */
  readonly hideLabel?: boolean | undefined;
}

interface FieldIds {
  readonly id: string;
  readonly describedBy: string | undefined;
}

interface Props extends FieldFrameProps {
  readonly children: (ids: FieldIds) => ReactNode;
}

/** Label above, help under it, the error under the field, tied together for screen readers. */
export function FieldFrame({ label, help, error, hideLabel, children }: Props) {
  const id = useId();
  const helpId = `${id}-help`;
  const errorId = `${id}-error`;
  const describedBy = [help && helpId, error && errorId].filter(Boolean).join(" ") || undefined;
  return (
    <View style={styles.field}>
      <DomLabel
        htmlFor={id}
        className={hideLabel ? "visually-hidden" : ""}
        style={[type.strong, styles.label]}
      >
        {label}
      </DomLabel>
      {help ? (
        <Text nativeID={helpId} variant="small" tone="inkSoft">
          {help}
        </Text>
      ) : null}
      {children({ id, describedBy })}
      <FieldError id={errorId} message={error} />
    </View>
  );
}

/** Always in the page, so that a screen reader hears the message arrive. */
export function FieldError({ id, message }: { id: string; message: string | undefined }) {
  return (
    <View nativeID={id} aria-live="polite" style={message ? styles.error : styles.noError}>
      {message ? (
        <>
          <Sign kind="fault" size={16} />
          <Text variant="small" tone="fault" style={styles.message}>
            {message}
          </Text>
        </>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  field: { gap: space.xs },
  label: { color: color.ink, display: "flex" },
  error: { flexDirection: "row", gap: space.xs + 2, alignItems: "flex-start", paddingTop: space.hair },
  // Takes back the gap that it would add while it is empty.
  noError: { marginTop: -space.xs },
  message: { flex: 1 },
});
