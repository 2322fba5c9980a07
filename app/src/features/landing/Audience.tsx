import { StyleSheet, View } from "react-native";
import { Heading } from "@/ui/Heading.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useIsMedium } from "@/ui/useMediaQuery.ts";

const PEOPLE = [
  {
    who: "The engineer",
    does: "lays out the linkage round bought parts and a fixed frame, reaches the targets, and saves a revision that can be stood by.",
  },
  {
    who: "The fabricator",
    does: "gets a hardpoint table in the jig's own datum and units, on a phone if need be, and knows whether it is released.",
  },
  {
    who: "The reviewer",
    does: "reads a saved study without being able to break it, and pins a comment to the very point it is about.",
  },
  {
    who: "The owner",
    does: "keeps the builds apart, sees who did what, and knows which numbers left the house.",
  },
] as const;

export function Audience() {
  const isMedium = useIsMedium();
  return (
    <>
      <Heading level={2} variant="title">
        Four people, one study
      </Heading>
      <View role="list" style={styles.list}>
        {PEOPLE.map(({ who, does }) => (
          <View role="listitem" key={who} style={[styles.row, isMedium && styles.rowWide]}>
            <Text variant="block" style={isMedium ? styles.who : null}>
              {who}
            </Text>
            <Text style={styles.does}>{does}</Text>
          </View>
        ))}
      </View>
    </>
  );
}

const styles = StyleSheet.create({
  list: { margin: 0, padding: 0, borderTopWidth: 1, borderTopColor: color.rule },
  row: { paddingVertical: space.l, borderBottomWidth: 1, borderBottomColor: color.rule, gap: space.xs },
  rowWide: { flexDirection: "row", gap: space.xl, alignItems: "baseline" },
  who: { width: 180 },
  does: { flex: 1, maxWidth: 720 },
});
