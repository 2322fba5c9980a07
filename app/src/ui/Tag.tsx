import { StyleSheet, View } from "react-native";
import { Text } from "./Text.tsx";
import { type ColorName, color, corner, space } from "./theme/tokens.ts";

interface TagProps {
  readonly label: string;
  readonly tone?: ColorName;
}

/** A word in a hairline frame: the state of a thing. The word says it; the colour only helps the eye. */
export function Tag({ label, tone = "inkSoft" }: TagProps) {
  return (
    <View style={[styles.tag, { borderColor: color[tone] }]}>
      <Text variant="label" tone={tone} numberOfLines={1}>
        {label}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  tag: {
    borderWidth: 1,
    borderRadius: corner,
    paddingHorizontal: space.s,
    paddingVertical: 3,
    alignSelf: "flex-start",
  },
});
