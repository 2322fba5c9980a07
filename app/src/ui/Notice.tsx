import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { HiddenText } from "./HiddenText.tsx";
import { Sign, type SignKind } from "./Sign.tsx";
import { Text } from "./Text.tsx";
import { type ColorName, color, space } from "./theme/tokens.ts";

interface NoticeProps {
  readonly kind: SignKind;
  readonly title?: string;
  readonly children?: ReactNode;
  /** Read out when it arrives: faults at once, the rest when the person pauses. */
  readonly live?: boolean;
  readonly actions?: ReactNode;
}

const BAR: Record<SignKind, ColorName> = { ok: "chromate", amber: "amber", fault: "fault", info: "dye" };
const WASH: Record<SignKind, ColorName> = {
  ok: "chromateWash",
  amber: "amberWash",
  fault: "faultWash",
  info: "dyeWash",
};
/** Heard instead of seen: the sign as a word. */
const WORD: Record<SignKind, string> = { ok: "Good", amber: "Caution", fault: "Fault", info: "Note" };

export function Notice({ kind, title, children, live, actions }: NoticeProps) {
  const role = live ? (kind === "fault" ? "alert" : "status") : undefined;
  return (
    <View
      role={role}
      style={[styles.notice, { borderLeftColor: color[BAR[kind]], backgroundColor: color[WASH[kind]] }]}
    >
      <Sign kind={kind} />
      <View style={styles.words}>
        <HiddenText>{`${WORD[kind]}: `}</HiddenText>
        {title ? (
          <Text variant="strong" tone={kind === "info" ? "ink" : BAR[kind]}>
            {title}
          </Text>
        ) : null}
        {typeof children === "string" ? <Text>{children}</Text> : children}
        {actions ? <View style={styles.actions}>{actions}</View> : null}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  notice: { flexDirection: "row", gap: space.m, padding: space.m, paddingRight: space.l, borderLeftWidth: 3 },
  words: { flex: 1, gap: space.xs, minWidth: 0 },
  actions: { flexDirection: "row", flexWrap: "wrap", gap: space.s, paddingTop: space.s },
});
