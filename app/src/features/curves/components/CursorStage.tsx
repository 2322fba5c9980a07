import type { LengthUnit } from "@linkwright/contract";
import { type ReactNode, useCallback } from "react";
import { RuleStage } from "@/ui/rule/RuleStage.tsx";
import { usePose, usePoseStore } from "../pose/PoseProvider.tsx";
import type { TravelRange } from "../series/heights.ts";

interface CursorStageProps {
  readonly range: TravelRange;
  readonly units: LengthUnit;
  readonly children: ReactNode;
  readonly height?: number;
}

/** The rule's stage on the study's pose. Of all around it, it alone renders anew when the cursor moves. */
export function CursorStage({ range, units, children, height }: CursorStageProps) {
  const store = usePoseStore();
  const travel = usePose((pose) => pose.travel);
  const moveTo = useCallback((next: number) => store.change({ travel: next }), [store]);
  const held = Math.min(range.to, Math.max(range.from, travel));
  return (
    <RuleStage
      from={range.from}
      to={range.to}
      travel={held}
      onTravel={moveTo}
      unit={units}
      {...(height === undefined ? {} : { height })}
    >
      {children}
    </RuleStage>
  );
}
