import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { Text } from "./Text.tsx";
import { color, space } from "./theme/tokens.ts";
import { useIsWide } from "./useMediaQuery.ts";

interface TopBarProps {
  readonly start: ReactNode;
  readonly middle?: ReactNode;
  readonly end?: ReactNode;
}

export const TOP_BAR_HEIGHT = 56;

/** The head of every page; stays in sight while the page scrolls. */
export function TopBar({ start, middle, end }: TopBarProps) {
  const isWide = useIsWide();
  return (
    <>
      <a className="skip-link" href="#content">
        <Text tone="onDye">Skip to the content</Text>
      </a>
      <View role="banner" style={[styles.bar, isWide && styles.wide]}>
        <View style={styles.start}>{start}</View>
        {middle ? <View style={styles.middle}>{middle}</View> : null}
        <View style={styles.end}>{end}</View>
      </View>
    </>
  );
}

const styles = StyleSheet.create({
  bar: {
    position: "sticky",
    top: 0,
    zIndex: 25,
    minHeight: TOP_BAR_HEIGHT,
    flexDirection: "row",
    alignItems: "center",
    gap: space.l,
    paddingHorizontal: space.l,
    backgroundColor: color.panel,
    borderBottomWidth: 1,
    borderBottomColor: color.rule,
  },
  wide: { paddingHorizontal: space.xl },
  start: { flexShrink: 1, minWidth: 0, flexDirection: "row", alignItems: "center" },
  middle: { alignSelf: "stretch", flexDirection: "row", flexShrink: 0 },
  end: { flexGrow: 1, flexDirection: "row", alignItems: "center", justifyContent: "flex-end", gap: space.s },
});
