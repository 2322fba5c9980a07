import type { LengthUnit } from "@linkwright/contract";
import type { Study } from "@linkwright/kinematics";
import { View } from "react-native";
import { formatAngle, formatLength } from "@/lib/format.ts";
import { Button } from "@/ui/Button.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import { STARTING_TARGETS, type StartingTarget, withStartingTarget } from "../targets/starting.ts";

interface StartingTargetsProps {
  readonly study: Study;
  readonly units: LengthUnit;
  readonly onTake: (changed: ReturnType<typeof withStartingTarget>) => void;
}

/** Offered while a study has no target for bump steer. */
export function StartingTargets({ study, units, onTake }: StartingTargetsProps) {
  if (study.targets.some(({ quantity }) => quantity === "bumpSteerDeg")) return null;
  return (
    <Notice
      kind="info"
      title="No target for bump steer yet"
      actions={STARTING_TARGETS.map((target) => (
        <Button
          key={target.id}
          label={labelOf(target, units)}
          onPress={() => onTake(withStartingTarget(study, target))}
        />
      ))}
    >
      <View>
        <Text variant="small">
          Start from common practice, per wheel. It sets the band of every ride height too; change both under
          Points.
        </Text>
      </View>
    </Notice>
  );
}

function labelOf({ label, bumpSteerDeg, travel }: StartingTarget, units: LengthUnit): string {
  const decimals = units === "inch" ? 1 : 0;
  return `${label}: ±${formatAngle(bumpSteerDeg)} over ±${formatLength(travel, units, { decimals })}`;
}
