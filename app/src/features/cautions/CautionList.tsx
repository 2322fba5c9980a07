import { CAUTIONS } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { Sign } from "@/ui/Sign.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";

/** Every caution in full: at sign-up, on the start page and on the method page alike. */
export function CautionList() {
  return (
    <View role="list" style={styles.list}>
      {CAUTIONS.map(({ title, text }) => (
        <View role="listitem" key={title} style={styles.item}>
          <Sign kind="amber" />
          <View style={styles.words}>
            <Text variant="strong">{title}</Text>
            <Text>{text}</Text>
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space.l, margin: 0, padding: 0 },
  item: {
    flexDirection: "row",
    gap: space.m,
    paddingLeft: space.m,
    borderLeftWidth: 3,
    borderLeftColor: color.amber,
  },
  words: { flex: 1, gap: space.hair },
});
