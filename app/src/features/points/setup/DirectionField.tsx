import { readAt } from "@linkwright/contract";
import type { Coordinates, Path } from "@linkwright/kinematics";
import { StyleSheet, View } from "react-native";
import { useStudy } from "@/features/study/index.ts";
import { Button } from "@/ui/Button.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { StepperRow } from "../components/StepperRow.tsx";
import { keptAt } from "../entry/attempt.ts";
import { useEntry } from "../entry/EntryProvider.tsx";
import { AXES, AXIS_NAMES, fieldOf, withCoordinate } from "../entry/rows.ts";

interface DirectionFieldProps {
  readonly path: Path;
  readonly label: string;
  readonly help: string;
}

/** A direction by its three components, entered one by one and checked as a whole. */
export function DirectionField({ path, label, help }: DirectionFieldProps) {
  const { study, mayEdit } = useStudy();
  const { kept, enter, putBack } = useEntry();
  const held = keptAt(kept, path);
  // The path leads to a direction, and nothing but one is kept under it.
  const direction = (held ? held.change.to : readAt(study, path)) as unknown as Coordinates;
  const told = held && `${held.issue.problem} ${held.issue.hint}`;
  const name = path.join(".");
  return (
    <View role="group" aria-label={label} style={styles.group}>
      <Text variant="strong">{label}</Text>
      <Text variant="small" tone="inkSoft">
        {help}
      </Text>
      {AXES.map((axis) => (
        <StepperRow
          key={axis}
          label={AXIS_NAMES[axis]}
          value={direction[axis]}
          decimals={3}
          step={0.01}
          disabled={!mayEdit}
          error={held?.field === fieldOf(name, axis) ? told : undefined}
          onCommit={(value) => enter(path, [...withCoordinate(direction, axis, value)], fieldOf(name, axis))}
        />
      ))}
      {held ? <Button label="Put the direction back as it is drawn" onPress={() => putBack(path)} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({ group: { gap: space.s } });
