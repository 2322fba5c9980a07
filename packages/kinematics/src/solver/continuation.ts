// Staying on one assembly: the pose is carried from where it stands along a path of inputs, in steps that shrink
// where the linkage turns quickly, and never across a position in which the Jacobian changes sign.

import { EQUATIONS, type PoseSystem, STRIDE } from "./constraints.ts";
import { eliminate } from "./eliminate.ts";
import { CLOSURE, evaluate, solvePose } from "./newton.ts";

/** mm of input. A path that cannot go on is narrowed down to this; larger blurs the last good travel. */
const FINEST_STEP = 1e-8;

/** mm of input (or degrees) in one step: well inside what contracts for arms of a car's size. */
const LONGEST_STEP = 20;

const POSE = 7;

const WIDTH = EQUATIONS + 1;

/** A straight line of inputs. `place` writes those at `fraction` (0 … 1) of it into the system. */
export interface InputPath {
  /** Its length, mm or degrees of input. */
  readonly length: number;
  place(fraction: number): void;
}

export type FollowOutcome =
  | { readonly status: "arrived" }
  /** The inputs could not be followed beyond `fraction`; the system stands there, assembled. */
  | { readonly status: "stopped"; readonly fraction: number };

/** Follows `path` from its beginning, where the system must stand assembled. `branch`: see branchOf. */
export function follow(system: PoseSystem, path: InputPath, branch: number): FollowOutcome {
  const { pose } = system;
  const lastGood = Float64Array.from(pose);
  const finest = FINEST_STEP / Math.max(path.length, FINEST_STEP);
  let step = Math.min(1, LONGEST_STEP / Math.max(path.length, FINEST_STEP));
  let fraction = 0;
  while (fraction < 1) {
    const next = Math.min(1, fraction + step);
    path.place(next);
    if (solvePose(system) >= 0 && branchOf(system) === branch) {
      fraction = next;
      lastGood.set(pose);
      step *= 2;
      continue;
    }
    pose.set(lastGood);
    step = (next - fraction) / 2;
    if (step < finest) {
      path.place(fraction);
      return { status: "stopped", fraction };
    }
  }
  return { status: "arrived" };
}

/** Sign of the Jacobian's determinant at the present pose: it keeps its sign on one assembly. 0: singular. */
export function branchOf(system: PoseSystem): number {
  evaluate(system);
  return eliminate(system.work, system.step, system.report) ? Math.sign(system.report[0] as number) : 0;
}

/** Values of one drive and the poses at them; kept and used again, for typed arrays are dear to make. */
export interface PoseColumn {
  values: Float64Array;
  /** 7 numbers a value: qw qx qy qz tx ty tz. */
  poses: Float64Array;
  /** How many values there are; the arrays may be longer. */
  count: number;
  /** How many of the first poses are solved already, at least one: the system stands at the last of them. */
  known: number;
  /** The last value that could be reached. */
  limit: number;
}

/**
 * Solves a column of poses over the values of one drive, the hot path of every sweep. Returns how many values
 * were reached.
 *
 * Evenly spaced values are predicted by the polynomial through up to four poses before (error of the order of
 * step⁴), so that one elimination usually closes a pose; what does not close so goes the careful way of `follow`.
 */
export function followColumn(system: PoseSystem, drive: number, column: PoseColumn, branch: number): number {
  const { values, poses, count, known } = column;
  const { pose, table, report } = system;
  const slot = drive * STRIDE + 9;
  let run = evenlySpaced(values, known - 1);
  for (let i = known; i < count; i++) {
    const value = values[i] as number;
    const step = Math.abs(value - (values[i - 1] as number));
    run = goesOnEvenly(values, i) ? run + 1 : 1;
    table[slot] = value;
    predict(poses, i, run, pose);
    // A prediction off by more than a tenth of the step has missed a bend: go carefully.
    const startLimit = CLOSURE + (run === 1 ? Math.min(step, LONGEST_STEP) : 0.1 * step);
    // The last elimination stood one Newton step short of the pose: near enough for the determinant's sign.
    if (!(solvePose(system, startLimit) >= 0 && Math.sign(report[0] as number) === branch)) {
      const reached = followStep(system, slot, values, poses, i, branch);
      if (reached !== value) {
        column.limit = reached;
        return i;
      }
    }
    const at = i * POSE;
    for (let k = 0; k < POSE; k++) poses[at + k] = pose[k] as number;
  }
  column.limit = values[count - 1] as number;
  return count;
}

/** Carries the system from the pose of value i − 1 to value i; returns the value it got to. */
function followStep(
  system: PoseSystem,
  slot: number,
  values: Float64Array,
  poses: Float64Array,
  i: number,
  branch: number,
): number {
  const { pose, table } = system;
  const value = values[i] as number;
  const before = values[i - 1] as number;
  for (let k = 0; k < POSE; k++) pose[k] = poses[(i - 1) * POSE + k] as number;
  const valueAt = (fraction: number) => (fraction === 1 ? value : before + (value - before) * fraction);
  const path: InputPath = {
    length: Math.abs(value - before),
    place: (fraction) => {
      table[slot] = valueAt(fraction);
    },
  };
  const outcome = follow(system, path, branch);
  return valueAt(outcome.status === "arrived" ? 1 : outcome.fraction);
}

/**
 * Extrapolates the pose of value `i` from the poses before it: `run` of them (1 and more) stand as far apart as
 * value i from the last, and four at most are used.
 */
function predict(poses: Float64Array, i: number, run: number, pose: Float64Array): void {
  const a = (i - 1) * POSE;
  const b = a - POSE;
  const c = b - POSE;
  const d = c - POSE;
  if (run === 1) {
    for (let k = 0; k < POSE; k++) pose[k] = poses[a + k] as number;
    return;
  }
  if (run === 2) {
    for (let k = 0; k < POSE; k++) pose[k] = 2 * (poses[a + k] as number) - (poses[b + k] as number);
  } else if (run === 3) {
    for (let k = 0; k < POSE; k++) {
      pose[k] = 3 * ((poses[a + k] as number) - (poses[b + k] as number)) + (poses[c + k] as number);
    }
  } else {
    for (let k = 0; k < POSE; k++) {
      const outer = 4 * ((poses[a + k] as number) + (poses[c + k] as number));
      pose[k] = outer - 6 * (poses[b + k] as number) - (poses[d + k] as number);
    }
  }
  makeUnit(pose);
}

/** How many values up to and with `last` are evenly spaced, as predict counts them: 1 for a single value. */
function evenlySpaced(values: Float64Array, last: number): number {
  let run = 1;
  for (let i = 2; i <= last; i++) run = goesOnEvenly(values, i) ? run + 1 : 1;
  return last === 0 ? 0 : run;
}

/** Whether value i stands as far from the one before as that one from its own. */
function goesOnEvenly(values: Float64Array, i: number): boolean {
  if (i < 2) return false;
  const last = values[i - 1] as number;
  const step = (values[i] as number) - last;
  return Math.abs(last - (values[i - 2] as number) - step) <= 1e-9 * Math.abs(step);
}

function makeUnit(pose: Float64Array): void {
  const qw = pose[0] as number;
  const qx = pose[1] as number;
  const qy = pose[2] as number;
  const qz = pose[3] as number;
  const unit = 1 / Math.sqrt(qw * qw + qx * qx + qy * qy + qz * qz);
  pose[0] = qw * unit;
  pose[1] = qx * unit;
  pose[2] = qy * unit;
  pose[3] = qz * unit;
}

/** The twist per unit of one drive at the present, solved pose, into `system.step`. False: singular. */
export function solveDriveTwist(system: PoseSystem, drive: number): boolean {
  evaluate(system);
  for (let e = 0; e < EQUATIONS; e++) system.work[e * WIDTH + EQUATIONS] = e === drive ? 1 : 0;
  return eliminate(system.work, system.step, system.report);
}

/**
 * Solves Jᵀ y = g at the present, solved pose, into `system.step`: y is the derivative of a scalar whose gradient
 * along the twist is `gradient` with respect to each equation's right-hand side. False: singular.
 */
export function solveAdjoint(system: PoseSystem, gradient: readonly number[]): boolean {
  evaluate(system);
  const { work } = system;
  for (let e = 0; e < EQUATIONS; e++) {
    for (let k = e + 1; k < EQUATIONS; k++) {
      const kept = work[e * WIDTH + k] as number;
      work[e * WIDTH + k] = work[k * WIDTH + e] as number;
      work[k * WIDTH + e] = kept;
    }
    work[e * WIDTH + EQUATIONS] = gradient[e] as number;
  }
  return eliminate(work, system.step, system.report);
}
