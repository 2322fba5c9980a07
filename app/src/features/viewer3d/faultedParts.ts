// Which parts of the picture a red fault is about.

import type { Fault } from "@linkwright/kinematics";

/** Names of bars, as parts.ts has them. Cautions colour nothing: they are told in words where they matter. */
export function faultedParts(faults: readonly Fault[]): ReadonlySet<string> {
  return new Set(faults.filter(({ severity }) => severity === "red").flatMap(partsOf));
}

function partsOf(fault: Fault): string[] {
  switch (fault.kind) {
    case "steersBackwards":
      return ["rack", "left.tieRod", "right.tieRod"];
    case "steeringNotStated":
      return [];
    case "nearToggle":
      return [`${fault.side}.tieRod`, `${fault.side}.steeringArm`];
    case "outOfReach":
      return [`${fault.side}.${fault.link}`];
  }
}
