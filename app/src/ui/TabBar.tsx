import type { Href } from "expo-router";
import { StyleSheet, View } from "react-native";
import { cssClass } from "./dom.tsx";
import { BlockLink } from "./Link.tsx";
import { Text } from "./Text.tsx";
import { color, space, touch } from "./theme/tokens.ts";

export interface Tab {
  readonly key: string;
  readonly label: string;
  readonly href: Href;
  /** A number worth a look, e.g. open comments; nothing is shown for 0. */
  readonly count?: number;
}

interface TabBarProps {
  readonly label: string;
  readonly tabs: readonly Tab[];
  readonly currentKey: string;
  /** At the foot of a phone's screen, within the thumb's reach, or within the head of a wide one. */
  readonly place: "foot" | "head";
}

export function TabBar({ label, tabs, currentKey, place }: TabBarProps) {
  const isFoot = place === "foot";
  return (
    <View
      role="navigation"
      aria-label={label}
      style={isFoot ? [cssClass("no-print"), styles.foot] : styles.head}
    >
      {tabs.map((tab) => {
        const isCurrent = tab.key === currentKey;
        return (
          <BlockLink
            key={tab.key}
            href={tab.href}
            className="tab"
            isCurrent={isCurrent}
            style={[
              styles.tab,
              isFoot ? styles.footTab : styles.headTab,
              isCurrent && (isFoot ? styles.footCurrent : styles.headCurrent),
            ]}
          >
            <Text
              variant="label"
              tone={isCurrent ? "dye" : "inkSoft"}
              style={[isFoot ? null : styles.headLabel, isCurrent && styles.current]}
            >
              {tab.label}
            </Text>
            {tab.count ? <Count value={tab.count} /> : null}
          </BlockLink>
        );
      })}
    </View>
  );
}

function Count({ value }: { value: number }) {
  return (
    <View style={styles.count}>
      <Text variant="figureSmall" tone="onDye" style={styles.countFigure}>
        {value}
      </Text>
    </View>
  );
}

const BAR = 3;

const styles = StyleSheet.create({
  foot: {
    position: "fixed",
    left: 0,
    right: 0,
    bottom: 0,
    zIndex: 20,
    flexDirection: "row",
    backgroundColor: color.panel,
    borderTopWidth: 1,
    borderTopColor: color.rule,
    paddingBottom: "env(safe-area-inset-bottom)" as never,
    overflowX: "auto",
  } as object,
  head: { flexDirection: "row", alignSelf: "stretch" },
  tab: {
    flexDirection: "row",
    alignItems: "center",
    justifyContent: "center",
    gap: space.xs,
    minHeight: touch,
  },
  footTab: {
    flex: 1,
    minWidth: 72,
    minHeight: 60,
    borderTopWidth: BAR,
    borderTopColor: "transparent",
    paddingBottom: BAR,
  },
  footCurrent: { borderTopColor: color.dye },
  headTab: {
    paddingHorizontal: space.l,
    borderBottomWidth: BAR,
    borderBottomColor: "transparent",
    paddingTop: BAR,
  },
  headCurrent: { borderBottomColor: color.dye },
  headLabel: { fontSize: 16, lineHeight: 22 },
  current: { fontWeight: "600" },
  count: {
    minWidth: 20,
    paddingHorizontal: 5,
    borderRadius: 10,
    backgroundColor: color.dye,
    alignItems: "center",
  },
  countFigure: { fontSize: 12, lineHeight: 20 },
});
