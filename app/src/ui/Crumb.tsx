import type { Href } from "expo-router";
import { StyleSheet } from "react-native";
import { BlockLink } from "./Link.tsx";
import { Text } from "./Text.tsx";
import { color, space, touch } from "./theme/tokens.ts";

/** The way back up, over a page's title. */
export function Crumb({ href, label }: { href: Href; label: string }) {
  return (
    <BlockLink href={href} className="crumb" style={styles.crumb}>
      <svg aria-hidden="true" width="8" height="12" viewBox="0 0 8 12">
        <path d="M6.5 1 1.5 6l5 5" fill="none" stroke={color.dye} strokeWidth="1.8" />
      </svg>
      <Text variant="label" tone="dye">
        {label}
      </Text>
    </BlockLink>
  );
}

const styles = StyleSheet.create({
  crumb: {
    flexDirection: "row",
    alignItems: "center",
    gap: space.s,
    alignSelf: "flex-start",
    minHeight: touch,
    minWidth: touch,
    marginTop: -space.m,
  },
});
