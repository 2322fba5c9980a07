import type { Href } from "expo-router";
import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { Heading } from "@/ui/Heading.tsx";
import { BlockLink } from "@/ui/Link.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, corner, space } from "@/ui/theme/tokens.ts";

interface CardProps {
  readonly href: Href;
  readonly title: string;
  readonly children: ReactNode;
  /** Who touched it last and when, along the foot. */
  readonly foot: string;
}

export function Card({ href, title, children, foot }: CardProps) {
  return (
    <View role="listitem" style={styles.item}>
      <BlockLink href={href} style={styles.card}>
        <Heading level={2} variant="section">
          {title}
        </Heading>
        <View style={styles.body}>{children}</View>
        <Text variant="small" tone="inkSoft" style={styles.foot}>
          {foot}
        </Text>
      </BlockLink>
    </View>
  );
}

const styles = StyleSheet.create({
  item: { minWidth: 0 },
  card: {
    flex: 1,
    gap: space.s,
    padding: space.l,
    backgroundColor: color.panel,
    borderWidth: 1,
    borderColor: color.rule,
    borderRadius: corner,
    minHeight: 132,
  },
  body: { flexGrow: 1, gap: space.s },
  foot: { borderTopWidth: 1, borderTopColor: color.rule, paddingTop: space.s, marginTop: space.xs },
});
