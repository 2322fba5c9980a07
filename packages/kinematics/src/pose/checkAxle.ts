// Whether a document's axle can be built and put together.

import type { Axle } from "../model/axle.ts";
import { checkGeometry } from "../model/check.ts";
import { checkStudyLists } from "../model/checkStudy.ts";
import { SIDES } from "../model/design.ts";
import type { Issue } from "../model/issue.ts";
import type { Study } from "../model/study.ts";
import { prepareCorner } from "./cornerSolver.ts";

/** Every reason why this axle cannot be built or does not assemble; none when it can. */
export function checkAxle(axle: Axle): Issue[] {
  const geometry = checkGeometry(axle);
  if (geometry.length > 0) return geometry;
  return SIDES.filter((side) => side === "left" || axle.right !== "mirror").flatMap((side) => {
    if (prepareCorner(axle, side).status === "ready") return [];
    return [
      {
        path: [side, "tieRod"],
        value: side === "left" ? axle.left.tieRod : undefined,
        problem: `The ${side} corner does not assemble as drawn: the links and the tie rod leave a motion free.`,
        hint: "Check that the tie rod's outer joint stands clear of the steering axis and that no link points along another.",
      },
    ];
  });
}

/** Every issue of a study: its axle's, with paths below `axle`, and its own. */
export function checkStudy(study: Study): Issue[] {
  return [
    ...checkAxle(study.axle).map((issue) => ({ ...issue, path: ["axle", ...issue.path] })),
    ...checkStudyLists(study),
  ];
}
