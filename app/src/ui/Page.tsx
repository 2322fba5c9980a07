import { type ReactNode, useEffect, useRef } from "react";
import { type Text as NativeText, StyleSheet, View } from "react-native";
import { Heading } from "./Heading.tsx";
import { Text } from "./Text.tsx";
import { space } from "./theme/tokens.ts";
import { useIsWide } from "./useMediaQuery.ts";
import { usePageTitle } from "./usePageTitle.ts";

interface PageProps {
  readonly title: string;
  /** Stands over the title: where this page belongs. */
  readonly crumb?: ReactNode;
  readonly intro?: string;
  readonly actions?: ReactNode;
  readonly children: ReactNode;
  /** Reading and forms want narrow lines, tables and cards the width. */
  readonly width?: "narrow" | "reading" | "full";
}

const MAX_WIDTH = { narrow: 480, reading: 760, full: 1200 } as const;

/** The first page of a visit keeps the focus where the browser put it; later ones are announced by their heading. */
const visit = { hasSeenPage: false };

/** The main part of a page with its one first-level heading. */
export function Page({ title, crumb, intro, actions, children, width = "full" }: PageProps) {
  usePageTitle(title);
  const isWide = useIsWide();
  const heading = useRef<NativeText>(null);
  useEffect(() => {
    window.scrollTo(0, 0);
    if (visit.hasSeenPage) (heading.current as unknown as HTMLElement | null)?.focus({ preventScroll: true });
    visit.hasSeenPage = true;
  }, []);
  return (
    <View
      role="main"
      nativeID="content"
      style={[styles.main, isWide && styles.wide, { maxWidth: MAX_WIDTH[width] }]}
    >
      <View style={styles.head}>
        <View style={styles.titles}>
          {crumb}
          <Heading ref={heading} level={1} tabIndex={-1}>
            {title}
          </Heading>
          {intro ? (
            <Text tone="inkSoft" style={styles.intro}>
              {intro}
            </Text>
          ) : null}
        </View>
        {actions ? <View style={styles.actions}>{actions}</View> : null}
      </View>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  main: {
    width: "100%",
    alignSelf: "center",
    paddingHorizontal: space.l,
    paddingTop: space.xl,
    paddingBottom: space.huge,
    gap: space.xl,
  },
  wide: { paddingHorizontal: space.xl, paddingTop: space.xxl },
  head: {
    flexDirection: "row",
    flexWrap: "wrap",
    alignItems: "flex-end",
    justifyContent: "space-between",
    gap: space.l,
  },
  titles: { flexShrink: 1, gap: space.xs },
  intro: { maxWidth: 640 },
  actions: { flexDirection: "row", gap: space.m, flexWrap: "wrap" },
});
