// The sweep: rows over travel and steer, both sides and the axle between them.

import { type CornerMeasures, measureCorner } from "../metrics/corner.ts";
import type { Axle } from "../model/axle.ts";
import { SIDES, type Side } from "../model/design.ts";
import {
  type CornerSolver,
  innerJointAt,
  poseAt,
  prepareCorner,
  steerTo,
  travelColumn,
} from "../pose/cornerSolver.ts";
import { bumpTwistAt } from "../pose/gradients.ts";
import { type AxleRow, axleRow } from "./axleRow.ts";
import { type SideRow, sideRow } from "./sideRow.ts";

export interface SweepRequest {
  /** From design, mm, bump positive. */
  readonly travels: readonly number[];
  /** mm of rack to the left; a fixed toe link takes 0 only. */
  readonly steers: readonly number[];
  /** Travel from design at which toe is set with the tie rod; 0 is the design height. */
  readonly wheelUp?: number;
}

export interface SweepRow {
  readonly steer: number;
  readonly travel: number;
  readonly left: SideRow | null;
  readonly right: SideRow | null;
  readonly axle: AxleRow;
  /** Why a field is null: `axle.ackermannPercent`, `left`. */
  readonly because: Readonly<Record<string, string>>;
}

export interface SweepEnd {
  readonly side: Side;
  readonly steer: number;
  /** The last travel that side reached that way; null when the steer itself is out of reach. */
  readonly lastTravel: number | null;
  /** The link that ran out, by its place in the corner: `tieRod`, `upperArm.frontPivot`. */
  readonly link: string;
}

export interface Sweep {
  readonly rows: readonly SweepRow[];
  readonly ends: readonly SweepEnd[];
}

/**
 * Both corners over every travel × steer, in that order of nesting: steer outside, travel inside. A side that
 * cannot be reached is null in that row and in all further rows that way; a row with neither side is left out.
 * Call it with an axle that checkAxle finds nothing wrong with.
 */
export function sweepAxle(axle: Axle, request: SweepRequest): Sweep {
  const { travels, steers, wheelUp = 0 } = request;
  const sides = {
    left: sweepSide(axle, "left", travels, steers, wheelUp),
    right: sweepSide(axle, "right", travels, steers, wheelUp),
  };
  const rows = steers.flatMap((steer, s) =>
    travels.flatMap((travel, t) => {
      const left = sides.left.at(s, t);
      const right = sides.right.at(s, t);
      if (left === null && right === null) return [];
      const straight = { left: sides.left.straight(t), right: sides.right.straight(t) };
      return [buildRow(axle, { steer, travel }, { left, right }, straight)];
    }),
  );
  return { rows, ends: [...sides.left.ends, ...sides.right.ends] };
}

function buildRow(
  axle: Axle,
  { steer, travel }: { steer: number; travel: number },
  sides: Readonly<Record<Side, CornerMeasures | null>>,
  straight: Readonly<Record<Side, CornerMeasures | null>>,
): SweepRow {
  const because: Record<string, string> = {};
  const rows = SIDES.map((side) => {
    const measures = sides[side];
    if (measures === null) {
      because[side] = "this side cannot be reached here; see ends";
      return null;
    }
    return sideRow(measures, (field, reason) => {
      because[`${side}.${field}`] = reason;
    });
  });
  const [left = null, right = null] = rows;
  const row = axleRow(axle, sides, straight, (field, reason) => {
    because[`axle.${field}`] = reason;
  });
  return { steer, travel, left, right, axle: row, because };
}

interface SideSweep {
  at(steerIndex: number, travelIndex: number): CornerMeasures | null;
  /** The same travel with the steering straight ahead. */
  straight(travelIndex: number): CornerMeasures | null;
  readonly ends: readonly SweepEnd[];
}

function sweepSide(
  axle: Axle,
  side: Side,
  travels: readonly number[],
  steers: readonly number[],
  wheelUp: number,
): SideSweep {
  const prepared = prepareCorner(axle, side, wheelUp);
  if (prepared.status !== "ready") {
    const lastTravel = prepared.status === "stopped" ? prepared.lastTravel : null;
    const link = prepared.status === "stopped" ? prepared.link : "tieRod";
    const ends = steers.map((steer) => ({ side, steer, lastTravel, link }));
    return { at: () => null, straight: () => null, ends };
  }
  const { solver } = prepared;
  const ends: SweepEnd[] = [];
  const columns = steers.map((steer) => {
    const column = measureColumn(solver, travels, steer);
    ends.push(...column.ends);
    return column.measures;
  });
  const straight = columns[steers.indexOf(0)] ?? measureColumn(solver, travels, 0).measures;
  return {
    at: (s, t) => columns[s]?.[t] ?? null,
    straight: (t) => straight[t] ?? null,
    ends,
  };
}

interface MeasuredColumn {
  readonly measures: readonly (CornerMeasures | null)[];
  readonly ends: readonly SweepEnd[];
}

/** One side's measures over travel at one steer. */
function measureColumn(solver: CornerSolver, travels: readonly number[], steer: number): MeasuredColumn {
  const { side } = solver.design;
  const steered = steerTo(solver, steer);
  if (steered.status === "stopped") {
    const { lastTravel, link } = steered;
    return { measures: travels.map(() => null), ends: [{ side, steer, lastTravel, link }] };
  }
  const column = travelColumn(solver, travels);
  const p_V_inner = innerJointAt(solver, steer);
  const measures = travels.map((travel, index) => {
    if (column.reached[index] === 0) return null;
    const bumpTwist = bumpTwistAt(solver, column.poses, index, { travel, steer });
    return measureCorner(solver.design, { pose: poseAt(column.poses, index), bumpTwist, p_V_inner });
  });
  return { measures, ends: column.ends.map((end) => ({ side, steer, ...end })) };
}
