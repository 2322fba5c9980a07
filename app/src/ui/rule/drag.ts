import type { PointerEvent } from "react";
import { mmFromLength } from "@/lib/format.ts";
import type { Stage } from "./RuleStage.tsx";

/** What a rule is read to: whole millimetres, or twentieths of an inch. */
export function rulerGrain(stage: Stage): number {
  return stage.unit === "inch" ? mmFromLength(0.05, "inch") : 1;
}

/** The cursor follows the pointer, on the rule and on the panels beside it alike. */
export function dragHandlers(stage: Stage) {
  const follow = (event: PointerEvent<HTMLElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    const grain = rulerGrain(stage);
    stage.moveTo(Math.round(stage.travelAt(event.clientY - box.top) / grain) * grain);
  };
  return {
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      if (event.button !== 0) return;
      event.currentTarget.setPointerCapture(event.pointerId);
      follow(event);
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      if (event.currentTarget.hasPointerCapture(event.pointerId)) follow(event);
    },
  };
}
