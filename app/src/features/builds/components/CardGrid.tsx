import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { space } from "@/ui/theme/tokens.ts";

export function CardGrid({ children }: { children: ReactNode }) {
  return (
    <View role="list" style={styles.grid as object}>
      {children}
    </View>
  );
}

const styles = StyleSheet.create({
  grid: {
    display: "grid",
    gridTemplateColumns: "repeat(auto-fill, minmax(min(100%, 340px), 1fr))",
    gap: space.l,
    margin: 0,
    padding: 0,
  } as object,
});
