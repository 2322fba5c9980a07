import type { LengthUnit } from "@linkwright/contract";
import { useStudy } from "@/features/study/index.ts";
import { formatAngle, formatLength } from "@/lib/format.ts";
import { Button } from "@/ui/Button.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import { STARTING_TARGETS, type StartingTarget, withStartingTarget } from "../targets/starting.ts";

/** Offered while a study has no target for bump steer, to whoever may set one. */
export function StartingTargets({ units }: { units: LengthUnit }) {
  const { study, mayEdit, changeValues } = useStudy();
  const hasTarget = study.targets.some(({ quantity }) => quantity === "bumpSteerDeg");
  if (hasTarget || !mayEdit) return null;
  const take = (starting: StartingTarget) => {
    const { targets, rideHeights } = withStartingTarget(study, starting);
    changeValues([
      { path: ["targets"], to: targets.map((target) => ({ ...target })) },
      { path: ["rideHeights"], to: rideHeights.map(({ band, ...rest }) => ({ ...rest, band: [...band] })) },
    ]);
  };
  return (
    <Notice
      kind="info"
      title="No target for bump steer yet"
      actions={STARTING_TARGETS.map((target) => (
        <Button key={target.id} label={labelOf(target, units)} onPress={() => take(target)} />
      ))}
    >
      <Text variant="small">
        Start from common practice, per wheel. It sets the band of every ride height too; change both under
        Points, Set-up.
      </Text>
    </Notice>
  );
}

function labelOf({ label, bumpSteerDeg, travel }: StartingTarget, units: LengthUnit): string {
  const decimals = units === "inch" ? 1 : 0;
  return `${label}: ±${formatAngle(bumpSteerDeg)} over ±${formatLength(travel, units, { decimals })}`;
}
