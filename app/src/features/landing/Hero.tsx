import { StyleSheet, View } from "react-native";
import { cssClass } from "@/ui/dom.tsx";
import { Heading } from "@/ui/Heading.tsx";
import { LinkButton } from "@/ui/Link.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { HeroDemo } from "./HeroDemo.tsx";

export function Hero() {
  const isWide = useIsWide();
  return (
    <View style={[cssClass("on-steel"), styles.steel]}>
      <View style={[styles.inner, isWide && styles.wide]}>
        <View style={[styles.words, isWide && styles.wideWords]}>
          <Heading level={1} variant="display" style={isWide ? null : styles.smallerDisplay}>
            Take the bump steer out before you weld
          </Heading>
          <Text style={styles.lead}>
            A workbench for small shops that build bolt-on front ends and independent suspension out of bought
            parts. Lay out the hardpoints, move the rack until toe holds still over the whole travel, and hand
            the jig a table that is certainly the released one.
          </Text>
          <View style={styles.actions}>
            <LinkButton href="/sign-up" kind="primary" label="Make a workshop" />
            <LinkButton href="/sign-in" label="Sign in" />
          </View>
        </View>
        <View style={styles.demo}>
          <HeroDemo />
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  steel: { backgroundColor: color.ground },
  inner: {
    width: "100%",
    maxWidth: 1360,
    alignSelf: "center",
    paddingHorizontal: space.l,
    paddingVertical: space.xxl,
    gap: space.xxl,
  },
  wide: {
    flexDirection: "row",
    alignItems: "center",
    paddingHorizontal: space.xl,
    paddingVertical: 56,
    gap: 56,
  },
  words: { gap: space.l },
  wideWords: { width: 400, flexShrink: 0 },
  smallerDisplay: { fontSize: 36, lineHeight: 40 },
  lead: { fontSize: 18, lineHeight: 28 },
  actions: { flexDirection: "row", flexWrap: "wrap", gap: space.m },
  demo: { flex: 1, minWidth: 0 },
});
