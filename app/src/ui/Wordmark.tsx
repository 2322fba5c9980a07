import { StyleSheet, View } from "react-native";
import { HiddenText } from "./HiddenText.tsx";
import { Text } from "./Text.tsx";
import { color, space } from "./theme/tokens.ts";

/** A link passing through a centre-punch. */
export function Mark({ size = 26 }: { size?: number }) {
  return (
    <svg aria-hidden="true" width={size} height={size} viewBox="0 0 26 26" style={{ flexShrink: 0 }}>
      <g fill="none" stroke={color.dye} strokeWidth="2.4">
        <circle cx="13" cy="13" r="8.4" />
        <path d="M0.5 13h9.2M16.3 13h9.2" />
      </g>
      <circle cx="13" cy="13" r="2.6" fill={color.oxide} />
    </svg>
  );
}

export function Wordmark({ hideName }: { hideName?: boolean }) {
  return (
    <View style={styles.row}>
      <Mark />
      {hideName ? <HiddenText>Linkwright</HiddenText> : <Text variant="section">Linkwright</Text>}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: "row", alignItems: "center", gap: space.s + 2 },
});
