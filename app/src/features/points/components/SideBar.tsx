import { mirrorCorner } from "@linkwright/kinematics";
import { StyleSheet, View } from "react-native";
import { usePose, usePoseStore } from "@/features/curves/index.ts";
import { type EditValue, useStudy } from "@/features/study/index.ts";
import { Button } from "@/ui/Button.tsx";
import { Choice } from "@/ui/Choice.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";

/** Which side's points are listed, and the way from a mirrored right side to one of its own and back. */
export function SideBar() {
  const { study, mayEdit, changeValue } = useStudy();
  const store = usePoseStore();
  const side = usePose((pose) => pose.side);
  const { left, right } = study.axle;
  const setRight = (to: unknown) => changeValue(["axle", "right"], to as EditValue);
  if (right === "mirror") {
    return (
      <View style={styles.row}>
        <Text variant="label" tone="inkSoft" style={styles.words}>
          Left, mirrored
        </Text>
        {mayEdit ? (
          <Button
            kind="quiet"
            label="Give the right its own points"
            onPress={() => {
              setRight(mirrorCorner(left));
              store.change({ side: "right" });
            }}
          />
        ) : null}
      </View>
    );
  }
  return (
    <View style={styles.row}>
      <Choice
        label="Side"
        hideLabel
        compact
        value={side}
        options={[
          { value: "left", label: "Left" },
          { value: "right", label: "Right" },
        ]}
        onChange={(next) => store.change({ side: next })}
      />
      {mayEdit ? (
        <Button kind="quiet" label="Mirror the left again" onPress={() => setRight("mirror")} />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", gap: space.s },
  words: { flexGrow: 1 },
});
