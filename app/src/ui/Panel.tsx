import type { ReactNode } from "react";
import { type StyleProp, StyleSheet, View, type ViewStyle } from "react-native";
import { Heading } from "./Heading.tsx";
import { color, corner, space } from "./theme/tokens.ts";

interface PanelProps {
  readonly children: ReactNode;
  readonly title?: string;
  readonly level?: 2 | 3;
  /** Stands at the end of the title's line. */
  readonly aside?: ReactNode;
  /** Without padding, for tables and lists that run to the edge. */
  readonly flush?: boolean;
  readonly style?: StyleProp<ViewStyle>;
}

export function Panel({ children, title, level = 2, aside, flush, style }: PanelProps) {
  return (
    <View style={[styles.panel, style]}>
      {title || aside ? (
        <View style={styles.head}>
          {title ? (
            <Heading level={level} variant="block" style={styles.title}>
              {title}
            </Heading>
          ) : null}
          {aside}
        </View>
      ) : null}
      <View style={flush ? null : styles.body}>{children}</View>
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { backgroundColor: color.panel, borderWidth: 1, borderColor: color.rule, borderRadius: corner },
  head: {
    flexDirection: "row",
    flexWrap: "wrap",
    alignItems: "center",
    alignContent: "center",
    gap: space.m,
    minHeight: 48,
    paddingHorizontal: space.l,
    paddingVertical: space.s,
    borderBottomWidth: 1,
    borderBottomColor: color.rule,
  },
  title: { flex: 1 },
  body: { padding: space.l, gap: space.l },
});
