import { StyleSheet, View } from "react-native";
import { cssClass } from "./dom.tsx";
import { HiddenText } from "./HiddenText.tsx";
import { color, corner, space } from "./theme/tokens.ts";

interface LoadingProps {
  /** What is coming, e.g. "Loading the builds". */
  readonly label: string;
  readonly rows?: number;
  readonly rowHeight?: number;
}

/** Bars where the content will stand. */
export function Loading({ label, rows = 3, rowHeight = 64 }: LoadingProps) {
  const bars = Array.from({ length: rows }, (_, index) => `bar-${index}`);
  return (
    <View role="status" aria-busy style={styles.stack}>
      <HiddenText>{`${label}…`}</HiddenText>
      {bars.map((bar) => (
        <View key={bar} style={[cssClass("breathes"), styles.bar, { height: rowHeight }]} />
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  stack: { gap: space.m },
  bar: { backgroundColor: color.steel, borderRadius: corner },
});
