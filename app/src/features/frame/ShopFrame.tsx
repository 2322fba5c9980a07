import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { useWorkshop } from "@/features/session/index.ts";
import { BlockLink } from "@/ui/Link.tsx";
import { Text } from "@/ui/Text.tsx";
import { TopBar } from "@/ui/TopBar.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useIsMedium } from "@/ui/useMediaQuery.ts";
import { Wordmark } from "@/ui/Wordmark.tsx";
import { PersonMenu } from "./PersonMenu.tsx";

/** The head of a workshop's pages, all but the open study, which has its own. */
export function ShopFrame({ children }: { children: ReactNode }) {
  const { workshopName } = useWorkshop();
  const isMedium = useIsMedium();
  return (
    <View style={styles.frame}>
      <TopBar
        start={
          <BlockLink
            href="/builds"
            className="row-link"
            label={`Linkwright, the builds of ${workshopName}`}
            style={styles.home}
          >
            <Wordmark hideName={!isMedium} />
            <View style={styles.divider} />
            <Text tone="inkSoft" numberOfLines={1} style={styles.name}>
              {workshopName}
            </Text>
          </BlockLink>
        }
        end={<PersonMenu />}
      />
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  frame: { flexGrow: 1, flexShrink: 0 },
  home: {
    flexDirection: "row",
    alignItems: "center",
    gap: space.m,
    minHeight: 44,
    flexShrink: 1,
    minWidth: 0,
  },
  divider: { width: 1, height: 22, backgroundColor: color.rule },
  name: { flexShrink: 1 },
});
