// Moves, answers and leftovers in words.

import type { LengthUnit } from "@linkwright/contract";
import { type FlattenOutcome, type Move, type Steering, steeringUnit } from "@linkwright/kinematics";
import { formatAngle, formatAngleGradient, formatLength } from "../../lib/format.ts";
import type { Leftover } from "./leftover.ts";
import type { MoveSettings, OfferedMove } from "./moves.ts";

interface MoveWords {
  readonly name: string;
  /** What a positive figure does. */
  readonly help: string;
}

const WITH_RACK: Readonly<Record<OfferedMove, MoveWords>> = {
  rackHeight: { name: "Rack height", help: "+ lifts both inner joints" },
  rackForeAft: { name: "Rack fore and aft", help: "+ moves both inner joints ahead" },
  innerWidth: { name: "Inner joint width", help: "+ moves each inner joint outward" },
};
const WITHOUT_RACK: Readonly<Record<OfferedMove, MoveWords>> = {
  ...WITH_RACK,
  rackHeight: { ...WITH_RACK.rackHeight, name: "Inner joint height" },
  rackForeAft: { ...WITH_RACK.rackForeAft, name: "Inner joint fore and aft" },
};

export function moveWords(move: OfferedMove, steering: Steering): MoveWords {
  return (steeringUnit(steering) === null ? WITHOUT_RACK : WITH_RACK)[move];
}

type Found = Extract<FlattenOutcome, { status: "found" }>;

/** Why the search came to its end. */
export function stoppedInWords({ stopped }: Found): string {
  switch (stopped) {
    case "flat":
    case "smallStep":
    case "smallGain":
      return "The search came to its end: nothing flatter lies within these bounds near here.";
    case "noDescent":
      return "The search stopped: no step from here makes the curve flatter.";
    case "tooManyIterations":
      return "The search stopped after its most rounds, and it may not be the flattest yet: apply it and search again.";
  }
}

/** Bounds that hold the answer, each with where it stands. */
export function heldInWords(
  { heldBy }: Found,
  settings: MoveSettings,
  steering: Steering,
  units: LengthUnit,
): string[] {
  return heldBy.flatMap(({ move, bound }) => {
    if (!isOffered(move)) return [];
    const at = formatLength(settings[move][bound], units, { sign: "always" });
    const end = bound === "low" ? "lower" : "upper";
    return [
      `${moveWords(move, steering).name} is held by its ${end} bound, ${at}: without it the curve would be flatter.`,
    ];
  });
}

function isOffered(move: Move): move is OfferedMove {
  return move in WITH_RACK;
}

export interface LeftoverWords {
  readonly lead: string;
  readonly detail: string;
}

export function leftoverInWords(leftover: Leftover, units: LengthUnit): LeftoverWords {
  const { slopeDegPerMm, bowDeg, restDeg, kind } = leftover;
  const slope = `slope ${formatAngleGradient(slopeDegPerMm, units, "always")}`;
  const bow = `bow ${formatAngle(bowDeg, { decimals: 3, sign: "always" })}`;
  const detail = `Slope and bow that fit the curve best: ${slope}, ${bow}; ${formatAngle(restDeg, { decimals: 3 })} is neither.`;
  switch (kind) {
    case "nothing":
      return { lead: "nothing measurable is left.", detail };
    case "slope":
      return {
        lead: `what is left is mostly a slope: ${slopeDegPerMm > 0 ? "toe-in" : "toe-out"} in bump.`,
        detail,
      };
    case "bow":
      return {
        lead: `what is left is mostly a bow: ${bowDeg > 0 ? "toe-in" : "toe-out"} at both ends.`,
        detail,
      };
    case "rest":
      return { lead: "what is left is neither a slope nor a bow.", detail };
  }
}
