import type { LengthUnit } from "@linkwright/contract";
import { type ReactNode, useCallback, useRef } from "react";
import { StyleSheet } from "react-native";
import { DomDiv } from "@/ui/dom.tsx";
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
  // A drag is followed frame by frame; a key's step counts at once, or the next key would start from where it was.
  const isDragged = useRef(false);
  const moveTo = useCallback(
    (next: number) => (isDragged.current ? store.follow : store.change)({ travel: next }),
    [store],
  );
  const told = (dragged: boolean) => () => {
    isDragged.current = dragged;
  };
  const held = Math.min(range.to, Math.max(range.from, travel));
  return (
    <DomDiv
      onPointerMoveCapture={told(true)}
      onPointerDownCapture={told(false)}
      onKeyDownCapture={told(false)}
      style={height === undefined ? styles.fill : null}
    >
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
    </DomDiv>
  );
}

const styles = StyleSheet.create({
  fill: { flex: 1, minHeight: 0, display: "flex", flexDirection: "column" },
});
