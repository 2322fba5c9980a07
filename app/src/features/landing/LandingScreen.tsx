import { StyleSheet, View } from "react-native";
import { CautionList } from "@/features/cautions/index.ts";
import { Heading } from "@/ui/Heading.tsx";
import { Link, LinkButton } from "@/ui/Link.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { usePageTitle } from "@/ui/usePageTitle.ts";
import { Audience } from "./Audience.tsx";
import { Hero } from "./Hero.tsx";
import { MainJob } from "./MainJob.tsx";

export function LandingScreen() {
  usePageTitle("Linkwright");
  const isWide = useIsWide();
  return (
    <View role="main" nativeID="content">
      <Hero />
      <View style={[styles.section, isWide && styles.wideSection]}>
        <MainJob />
      </View>
      <View style={styles.tinted}>
        <View style={[styles.section, isWide && styles.wideSection]}>
          <Audience />
        </View>
      </View>
      <View style={[styles.section, isWide && styles.wideSection, isWide && styles.sideBySide]}>
        <View style={styles.cautionHead}>
          <Heading level={2} variant="title">
            Before anyone drives on it
          </Heading>
          <Text tone="inkSoft">
            These are shown once more at sign-up, where you acknowledge them, and stand on every sheet that
            leaves the house.
          </Text>
          <Link href="/method" standalone>
            How every quantity is defined, and its source
          </Link>
          <View style={styles.start}>
            <LinkButton href="/sign-up" kind="primary" label="Make a workshop" />
          </View>
        </View>
        <View style={styles.cautions}>
          <CautionList />
        </View>
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  section: {
    width: "100%",
    maxWidth: 1200,
    alignSelf: "center",
    paddingHorizontal: space.l,
    paddingVertical: space.xxxl,
    gap: space.xl,
  },
  wideSection: { paddingHorizontal: space.xl, paddingVertical: 64 },
  tinted: { backgroundColor: color.panel, borderTopWidth: 1, borderBottomWidth: 1, borderColor: color.rule },
  sideBySide: { flexDirection: "row", gap: 64 },
  cautionHead: { flex: 2, gap: space.m },
  cautions: { flex: 3 },
  start: { flexDirection: "row", paddingTop: space.s },
});
