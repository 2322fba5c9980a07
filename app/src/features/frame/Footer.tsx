import { StyleSheet, View } from "react-native";
import { Choice } from "@/ui/Choice.tsx";
import { Link } from "@/ui/Link.tsx";
import { Text } from "@/ui/Text.tsx";
import { THEME_CHOICES, type ThemeChoice, useTheme } from "@/ui/theme/ThemeProvider.tsx";
import { color, space } from "@/ui/theme/tokens.ts";

const THEME_LABEL: Record<ThemeChoice, string> = { system: "System", light: "Light", dark: "Dark" };
const OPTIONS = THEME_CHOICES.map((value) => ({ value, label: THEME_LABEL[value] }));

export function Footer() {
  const { choice, chooseTheme } = useTheme();
  return (
    <View role="contentinfo" style={styles.foot}>
      <View style={styles.words}>
        <Text variant="small" tone="inkSoft">
          Geometry only: the numbers say nothing of strength, fatigue, welds, brakes or handling at the limit.
        </Text>
        <Link href="/method" variant="small" standalone>
          Method and cautions
        </Link>
      </View>
      <Choice label="Theme" hideLabel compact value={choice} options={OPTIONS} onChange={chooseTheme} />
    </View>
  );
}

const styles = StyleSheet.create({
  foot: {
    flexDirection: "row",
    flexWrap: "wrap",
    alignItems: "center",
    justifyContent: "space-between",
    gap: space.l,
    padding: space.xl,
    borderTopWidth: 1,
    borderTopColor: color.rule,
  },
  words: { flexShrink: 1, gap: space.xs },
});
