import type { RideHeight } from "@linkwright/kinematics";
import { memo } from "react";
import { StyleSheet, View } from "react-native";
import { Choice } from "@/ui/Choice.tsx";
import { Select } from "@/ui/Select.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { usePose, usePoseStore } from "../pose/PoseProvider.tsx";
import { chooseHeight } from "../series/heights.ts";

interface HeightChoiceProps {
  readonly heights: readonly RideHeight[];
  /** Lets the person ask for the curves of all of them. */
  readonly withAll?: boolean;
}

const ALL = "all";
/** Letters of all options together, up to which they stand side by side on a phone. */
const SHORT = 26;

/** The ride height that the rule's zero stands for. */
export const HeightChoice = memo(function HeightChoice({ heights, withAll }: HeightChoiceProps) {
  const store = usePoseStore();
  const name = usePose((pose) => pose.height);
  const isEvery = usePose((pose) => pose.isEveryHeight) && withAll === true;
  const chosen = chooseHeight(heights, name);
  if (heights.length === 1) {
    return (
      <View style={styles.only}>
        <Text variant="label" tone="inkSoft">
          Ride height
        </Text>
        <Text variant="strong">{chosen.name}</Text>
      </View>
    );
  }
  const options = heights.map((height, at) => ({ value: String(at), label: unbroken(height.name) }));
  if (withAll) options.push({ value: ALL, label: "All" });
  const choose = (value: string) => {
    if (value === ALL) return store.change({ isEveryHeight: true });
    store.change({ isEveryHeight: false, height: heights[Number(value)]?.name ?? null });
  };
  const common = {
    label: "Ride height",
    value: isEvery ? ALL : String(heights.indexOf(chosen)),
    options,
    onChange: choose,
  };
  const isShort = options.reduce((letters, { label }) => letters + label.length, 0) <= SHORT;
  return (
    <View style={styles.row}>
      <Text variant="label" tone="inkSoft" aria-hidden>
        Ride height
      </Text>
      {isShort ? <Choice {...common} hideLabel compact /> : <Select {...common} hideLabel />}
    </View>
  );
});

/** Side by side, a name of two words stays on one line. */
function unbroken(name: string): string {
  return name.replaceAll(" ", "\u00a0");
}

const styles = StyleSheet.create({
  only: { flexDirection: "row", alignItems: "center", gap: space.s, minHeight: 44 },
  row: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", gap: space.s },
});
