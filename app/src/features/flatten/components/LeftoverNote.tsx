import { summariseCurve } from "@linkwright/kinematics";
import { memo, useMemo } from "react";
import type { HeightFigures, Reading } from "@/features/curves/index.ts";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import { leftoverInWords } from "../flattenWords.ts";
import { fitLeftover } from "../leftover.ts";

interface LeftoverNoteProps {
  readonly figures: HeightFigures;
  readonly reading: Reading;
}

/** What is left of the chosen ride height's curve, on its worse side. */
export const LeftoverNote = memo(function LeftoverNote({ figures, reading }: LeftoverNoteProps) {
  const { curves, height, judgement } = figures;
  const leftover = useMemo(() => {
    const swing = (curve: (typeof curves)[number]) => summariseCurve(curve)?.peakToPeakDeg ?? -1;
    const [one, other] = curves;
    const worse = one && other && swing(other) > swing(one) ? other : one;
    return worse ? fitLeftover(worse.travels, worse.bumpSteerDeg) : null;
  }, [curves]);
  if (leftover === null) return null;
  const { lead, detail } = leftoverInWords(leftover, reading.units);
  const isWithin = judgement?.verdict === "inside" || leftover.kind === "nothing";
  return (
    <Notice kind={isWithin ? "ok" : "amber"} title={`At ${height.name}: ${lead}`}>
      <Text variant="small">{detail}</Text>
    </Notice>
  );
});
