import { StyleSheet, View } from "react-native";
import { Heading } from "@/ui/Heading.tsx";
import { PunchMark } from "@/ui/PunchMark.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";

const STEPS = [
  {
    title: "Lay out the hardpoints",
    text: "Enter what you have measured round the bought parts and the frame, in millimetres or inches. Every change is solved at once, and the table, the view and the curves move together.",
  },
  {
    title: "Flatten the curve",
    text: "Move the rack by hand, or let it find the flattest place that the parts allow, over the bands of all your ride heights together. What would steer backwards or come near a toggle is told in red.",
  },
  {
    title: "Hand over the right one",
    text: "Save a revision that never changes again. The jig gets its table in its own datum and units, with revision, date, status and a short code that tells one from another. The reviewer pins comments to the points.",
  },
] as const;

export function MainJob() {
  const isWide = useIsWide();
  return (
    <>
      <Heading level={2} variant="title">
        From measured parts to a table on the jig
      </Heading>
      <View style={[styles.steps, isWide && styles.wide]}>
        {STEPS.map(({ title, text }) => (
          <View key={title} style={styles.step}>
            <View style={styles.head}>
              <PunchMark size={20} tone="dye" />
              <View style={styles.line} />
            </View>
            <Heading level={3}>{title}</Heading>
            <Text tone="inkSoft">{text}</Text>
          </View>
        ))}
      </View>
    </>
  );
}

const styles = StyleSheet.create({
  steps: { gap: space.xl },
  wide: { flexDirection: "row", gap: space.xxl },
  step: { flex: 1, gap: space.s },
  head: { flexDirection: "row", alignItems: "center", gap: space.s, paddingBottom: space.xs },
  line: { flex: 1, height: 1, backgroundColor: color.edge },
});
