// The stage on which a steel rule and the panels beside it share one travel axis and one cursor.
// Geometry and cursor are two contexts: moving the cursor repaints lines and read-outs, never the curves.

import type { LengthUnit } from "@linkwright/contract";
import { createContext, type ReactNode, useContext, useMemo } from "react";
import { DomDiv } from "../dom.tsx";
import { useSize } from "../useSize.ts";

/** Pixels above the travel axis within the drawing, and below it for the ticks of the value axis. */
const PAD_TOP = 14;
const PAD_BOTTOM = 30;
/** The heads of all panels are equally high, or their axes would not stand level. */
export const HEAD_HEIGHT = 62;

export interface Stage {
  readonly from: number;
  readonly to: number;
  readonly unit: LengthUnit;
  /** Of the drawings, without their heads. */
  readonly height: number;
  readonly top: number;
  readonly bottom: number;
  readonly yOf: (travel: number) => number;
  readonly travelAt: (y: number) => number;
  /** Held within the rule's ends. */
  readonly moveTo: (travel: number) => void;
}

const StageContext = createContext<Stage | null>(null);
const CursorContext = createContext(0);

interface RuleStageProps {
  /** Wheel travel at the rule's foot (droop, negative) and head (bump, positive), mm. */
  readonly from: number;
  readonly to: number;
  readonly travel: number;
  readonly onTravel: (travel: number) => void;
  readonly unit: LengthUnit;
  readonly children: ReactNode;
  /** In pixels; without it the stage fills its parent. */
  readonly height?: number;
}

export function RuleStage({ from, to, travel, onTravel, unit, children, height }: RuleStageProps) {
  const [ref, size] = useSize<HTMLDivElement>();
  const stage = useMemo<Stage>(() => {
    const drawn = Math.max(0, size.height - HEAD_HEIGHT);
    const top = PAD_TOP;
    const bottom = Math.max(top + 1, drawn - PAD_BOTTOM);
    const pixelsPerMm = (bottom - top) / (to - from);
    return {
      from,
      to,
      unit,
      height: drawn,
      top,
      bottom,
      yOf: (at) => bottom - (at - from) * pixelsPerMm,
      travelAt: (y) => from + (bottom - y) / pixelsPerMm,
      moveTo: (next) => onTravel(Math.min(to, Math.max(from, next))),
    };
  }, [size.height, from, to, unit, onTravel]);

  return (
    <StageContext.Provider value={stage}>
      <CursorContext.Provider value={travel}>
        <DomDiv
          ref={ref}
          style={{
            display: "flex",
            flexDirection: "row",
            minHeight: 0,
            ...(height ? { height } : { flex: 1 }),
          }}
        >
          {size.height > 0 ? children : null}
        </DomDiv>
      </CursorContext.Provider>
    </StageContext.Provider>
  );
}

export function useStage(): Stage {
  const stage = useContext(StageContext);
  if (!stage) throw new Error("A rule and its panels stand on a RuleStage.");
  return stage;
}

/** The travel that the cursor stands at, mm. */
export function useCursor(): number {
  return useContext(CursorContext);
}
