import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { Heading } from "./Heading.tsx";
import { PunchMark } from "./PunchMark.tsx";
import { Text } from "./Text.tsx";
import { color, corner, space } from "./theme/tokens.ts";

interface EmptyStateProps {
  readonly title: string;
  /** What would stand here, and how it comes to be. */
  readonly children: string;
  readonly action?: ReactNode;
  readonly level?: 2 | 3;
}

export function EmptyState({ title, children, action, level = 2 }: EmptyStateProps) {
  return (
    <View style={styles.box}>
      <PunchMark size={28} tone="edge" />
      <Heading level={level} variant="block">
        {title}
      </Heading>
      <Text tone="inkSoft" style={styles.words}>
        {children}
      </Text>
      {action ? <View style={styles.action}>{action}</View> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  box: {
    alignItems: "flex-start",
    gap: space.s,
    padding: space.xl,
    borderWidth: 1,
    borderStyle: "dashed",
    borderColor: color.edge,
    borderRadius: corner,
  },
  words: { maxWidth: 560 },
  action: { paddingTop: space.s },
});
