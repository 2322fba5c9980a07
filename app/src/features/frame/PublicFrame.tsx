import { useQuery } from "@tanstack/react-query";
import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { meQuery, remembersSession } from "@/api/auth.ts";
import { BlockLink, LinkButton } from "@/ui/Link.tsx";
import { TopBar } from "@/ui/TopBar.tsx";
import { useIsMedium } from "@/ui/useMediaQuery.ts";
import { Wordmark } from "@/ui/Wordmark.tsx";
import { Footer } from "./Footer.tsx";

/** Head and foot of the pages that everyone may see. */
export function PublicFrame({ children }: { children: ReactNode }) {
  const { data: me } = useQuery({ ...meQuery, enabled: remembersSession() });
  const isMedium = useIsMedium();
  return (
    <View style={styles.frame}>
      <TopBar
        start={
          <BlockLink href="/" className="row-link" label="Linkwright, to the start page">
            <Wordmark />
          </BlockLink>
        }
        end={
          me ? (
            <LinkButton href="/builds" kind="primary" label={isMedium ? "Open your workshop" : "Workshop"} />
          ) : (
            <>
              <LinkButton href="/sign-in" kind="quiet" label="Sign in" />
              {isMedium ? <LinkButton href="/sign-up" kind="primary" label="Make a workshop" /> : null}
            </>
          )
        }
      />
      <View style={styles.content}>{children}</View>
      <Footer />
    </View>
  );
}

const styles = StyleSheet.create({
  frame: { flexGrow: 1, flexShrink: 0 },
  content: { flexGrow: 1 },
});
