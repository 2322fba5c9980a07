// One corner ready to be moved: the system of its rows, the inputs that move it, and where its toe was set.

import type { Pose } from "../geometry/pose.ts";
import { transformPoint } from "../geometry/pose.ts";
import type { Drive } from "../geometry/rows.ts";
import { type Direction, distance, type Point } from "../geometry/vec3.ts";
import type { Axle } from "../model/axle.ts";
import { type CornerDesign, designCorner, type Side, TIE_ROD, tieRodRow } from "../model/design.ts";
import { steeringKind } from "../model/steering/index.ts";
import { equationIndex, type PoseSystem, setBodyPoint, setValue } from "../solver/constraints.ts";
import { branchOf, follow, followColumn, type PoseColumn } from "../solver/continuation.ts";
import { assembleSystem } from "../solver/pivotOrder.ts";
import { rowThatRanOut } from "../solver/ranOut.ts";
import { radFromDeg } from "../units.ts";

export const WHEEL_HEIGHT = "wheelHeight";
const TOE = "toe";
const UP: Direction<"V"> = [0, 0, 1];

/** Numbers of one pose in a column: qw qx qy qz tx ty tz of X_VK. */
export const POSE_NUMBERS = 7;

export interface CornerSolver {
  readonly design: CornerDesign;
  readonly axle: Axle;
  readonly system: PoseSystem;
  readonly wheelHeight: number;
  readonly tieRod: number;
  /** Sign of the Jacobian's determinant on this assembly. */
  readonly branch: number;
  /** Travel from design at which toe is set, steering straight ahead. */
  readonly wheelUp: number;
  /** The rod length that gives static toe there; the drawn length at the design height. */
  readonly tieRodLength: number;
  /** The pose there. */
  readonly start: Float64Array;
  /** Room for the two ways of a travel column, kept between calls. */
  readonly workspace: { readonly up: PoseColumn; readonly down: PoseColumn };
}

export type CornerSolverOutcome =
  | { readonly status: "ready"; readonly solver: CornerSolver }
  /** The Jacobian is singular as drawn: some motion is left free. */
  | { readonly status: "singular"; readonly side: Side }
  /** The ride height is out of reach. */
  | {
      readonly status: "stopped";
      readonly side: Side;
      readonly lastTravel: number;
      readonly link: string;
    };

/**
 * A corner assembled at the ride height `wheelUp`, where the tie rod is turned until static toe is the
 * document's again. The drawn rod length is kept at the design height, `wheelUp` 0.
 */
export function prepareCorner(axle: Axle, side: Side, wheelUp = 0): CornerSolverOutcome {
  const design = designCorner(axle, side);
  const rows = [...design.parts.rows, tieRodRow(design, design.tieRod.inner, design.tieRod.length)];
  const system = assembleSystem(rows, [wheelHeightDrive(design)]);
  const branch = branchOf(system);
  if (branch === 0) return { status: "singular", side };
  const common = {
    design,
    axle,
    system,
    wheelHeight: equationIndex(system, WHEEL_HEIGHT),
    tieRod: equationIndex(system, TIE_ROD),
    branch,
    wheelUp,
    workspace: { up: emptyTrack(), down: emptyTrack() },
  };
  if (wheelUp === 0) {
    const start = Float64Array.from(system.pose);
    return { status: "ready", solver: { ...common, tieRodLength: design.tieRod.length, start } };
  }
  const set = setToe(design, wheelUp);
  if (set.status !== "set") return set;
  setValue(system, common.tieRod, set.tieRodLength);
  setValue(system, common.wheelHeight, design.p_K_wheelCentre[2] + wheelUp);
  system.pose.set(set.pose);
  if (branchOf(system) !== branch) return { status: "singular", side };
  return { status: "ready", solver: { ...common, tieRodLength: set.tieRodLength, start: set.pose } };
}

type ToeSet =
  | { readonly status: "set"; readonly tieRodLength: number; readonly pose: Float64Array }
  | Exclude<CornerSolverOutcome, { status: "ready" }>;

/**
 * Carries the wheel to `wheelUp` with its toe held instead of its tie rod: toe is atan2(e.x, s·e.y), so it is
 * held by e.x·cos(toe) − s·e.y·sin(toe) = 0. The rod is then as long as its joints are apart.
 */
function setToe(design: CornerDesign, wheelUp: number): ToeSet {
  const toeRad = radFromDeg(design.wheel.toeDeg);
  const system = assembleSystem(design.parts.rows, [
    wheelHeightDrive(design),
    {
      kind: "drivenDirection",
      name: TOE,
      direction: design.u_K_spin,
      along: [Math.cos(toeRad), -design.outward * Math.sin(toeRad), 0],
      value: 0,
    },
  ]);
  const branch = branchOf(system);
  if (branch === 0) return { status: "singular", side: design.side };
  const drive = equationIndex(system, WHEEL_HEIGHT);
  const designHeight = design.p_K_wheelCentre[2];
  const outcome = follow(
    system,
    {
      length: Math.abs(wheelUp),
      place: (fraction) => setValue(system, drive, designHeight + wheelUp * fraction),
    },
    branch,
  );
  if (outcome.status === "stopped") {
    return {
      status: "stopped",
      side: design.side,
      lastTravel: wheelUp * outcome.fraction,
      link: rowThatRanOut(system, [WHEEL_HEIGHT, TOE]),
    };
  }
  const pose = Float64Array.from(system.pose);
  const p_V_outer = transformPoint(poseAt(pose), design.tieRod.outer);
  return { status: "set", tieRodLength: distance(design.tieRod.inner, p_V_outer), pose };
}

function wheelHeightDrive(design: CornerDesign): Drive {
  const point = design.p_K_wheelCentre;
  return { kind: "drivenPoint", name: WHEEL_HEIGHT, point, direction: UP, value: point[2] };
}

/** The inner tie-rod joint after `steer`. */
export function innerJointAt(solver: CornerSolver, steer: number): Point<"V"> {
  const { steering } = solver.axle;
  return steeringKind(steering).innerAt(steering, solver.design.tieRod.inner, steer);
}

export type Reached =
  | { readonly status: "reached" }
  | { readonly status: "stopped"; readonly lastTravel: number | null; readonly link: string };

/** Puts the corner back to its ride height and steers it there. */
export function steerTo(solver: CornerSolver, steer: number): Reached {
  const { system, tieRod, wheelHeight, design, wheelUp } = solver;
  system.pose.set(solver.start);
  setValue(system, wheelHeight, design.p_K_wheelCentre[2] + wheelUp);
  setValue(system, tieRod, solver.tieRodLength);
  setBodyPoint(system, tieRod, innerJointAt(solver, 0));
  if (steer === 0) return { status: "reached" };
  const outcome = follow(
    system,
    {
      length: Math.abs(steer),
      place: (fraction) => setBodyPoint(system, tieRod, innerJointAt(solver, steer * fraction)),
    },
    solver.branch,
  );
  if (outcome.status === "arrived") return { status: "reached" };
  // Steering reaches the knuckle through the tie rod alone, so that is what ran out.
  return { status: "stopped", lastTravel: null, link: TIE_ROD };
}

export interface TravelColumn {
  /** As asked, in that order. */
  readonly travels: readonly number[];
  /** POSE_NUMBERS for each of `travels`. */
  readonly poses: Float64Array;
  /** 1 where the travel was reached. */
  readonly reached: Uint8Array;
  /** Where the linkage ended before the asked travel did, at most one each way. */
  readonly ends: readonly { readonly lastTravel: number; readonly link: string }[];
}

/**
 * Poses over wheel travel (from design) at the present steer, from the ride height upwards and downwards.
 * Call steerTo first. The system is left somewhere on the way.
 */
export function travelColumn(solver: CornerSolver, travels: readonly number[]): TravelColumn {
  const { wheelUp, system, workspace } = solver;
  const column = {
    travels,
    poses: new Float64Array(travels.length * POSE_NUMBERS),
    reached: new Uint8Array(travels.length),
    ends: [] as { lastTravel: number; link: string }[],
  };
  const order = ascending(travels);
  let first = 0;
  while (first < order.length && (travels[order[first] as number] as number) < wheelUp) first++;
  const height = solver.design.p_K_wheelCentre[2];
  const { up, down } = workspace;
  makeRoom(up, 1 + order.length - first);
  up.known = 1;
  up.values[0] = height + wheelUp;
  copyPose(system.pose, 0, up.poses, 0);
  const solved = goOneWay(solver, up, order.slice(first), column);
  if (first === 0) return column;
  makeRoom(down, 4 + first);
  lookBack(up, solved, down);
  down.count = down.known + first;
  goOneWay(solver, down, order.slice(0, first).reverse(), column);
  return column;
}

/**
 * Follows the travels at `places` away from the last known pose of `track`, writes what is reached into `column`,
 * and returns how many poses of the track are solved.
 */
function goOneWay(
  solver: CornerSolver,
  track: PoseColumn,
  places: readonly number[],
  column: TravelColumn & { readonly ends: { lastTravel: number; link: string }[] },
): number {
  const { system, wheelHeight } = solver;
  const { known } = track;
  const height = solver.design.p_K_wheelCentre[2];
  for (let k = 0; k < places.length; k++) {
    track.values[known + k] = height + (column.travels[places[k] as number] as number);
  }
  copyPose(track.poses, known - 1, system.pose, 0);
  setValue(system, wheelHeight, track.values[known - 1] as number);
  const solved = followColumn(system, wheelHeight, track, solver.branch);
  for (let i = known; i < solved; i++) {
    const place = places[i - known] as number;
    copyPose(track.poses, i, column.poses, place);
    column.reached[place] = 1;
  }
  if (solved < track.count) {
    const link = rowThatRanOut(system, [WHEEL_HEIGHT]);
    column.ends.push({ lastTravel: track.limit - height, link });
  }
  return solved;
}

/**
 * The first poses of the way up, in the order in which the way down comes to them: with them behind it, the way
 * down is predicted from its first step. The track up begins at the ride height.
 */
function lookBack(up: PoseColumn, solved: number, down: PoseColumn): void {
  const from = solved > 1 && up.values[1] === up.values[0] ? 1 : 0;
  down.known = Math.min(4, solved - from);
  for (let k = 0; k < down.known; k++) {
    down.values[down.known - 1 - k] = up.values[from + k] as number;
    copyPose(up.poses, from + k, down.poses, down.known - 1 - k);
  }
}

/** A track for `count` poses: the arrays are made anew only when they are too short. */
function makeRoom(track: PoseColumn, count: number): void {
  track.count = count;
  if (track.values.length >= count) return;
  track.values = new Float64Array(2 * count);
  track.poses = new Float64Array(2 * count * POSE_NUMBERS);
}

function emptyTrack(): PoseColumn {
  return { values: new Float64Array(0), poses: new Float64Array(0), count: 0, known: 0, limit: 0 };
}

function copyPose(from: Float64Array, index: number, to: Float64Array, place: number): void {
  const read = index * POSE_NUMBERS;
  const write = place * POSE_NUMBERS;
  for (let k = 0; k < POSE_NUMBERS; k++) to[write + k] = from[read + k] as number;
}

/** Places of `travels` from the lowest travel to the highest. */
function ascending(travels: readonly number[]): number[] {
  const order: number[] = [];
  let isSorted = true;
  for (let i = 0; i < travels.length; i++) {
    order.push(i);
    if (i > 0 && (travels[i] as number) < (travels[i - 1] as number)) isSorted = false;
  }
  return isSorted ? order : order.sort((a, b) => (travels[a] as number) - (travels[b] as number));
}

/** The pose that starts at `index` × 7 of a column. */
export function poseAt(column: Float64Array, index = 0): Pose<"V", "K"> {
  const at = index * POSE_NUMBERS;
  const number = (k: number) => column[at + k] as number;
  return {
    rotation: [number(0), number(1), number(2), number(3)],
    translation: [number(4), number(5), number(6)],
  };
}
