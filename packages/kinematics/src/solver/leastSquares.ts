// Bounded Levenberg–Marquardt: the least sum of squares of smooth residuals with each unknown within bounds.

import { dampedStep } from "./linalg.ts";

export interface Evaluation {
  readonly residuals: Float64Array;
  /** One column of ∂r/∂x for each unknown. */
  readonly columns: readonly Float64Array[];
}

export interface LeastSquaresProblem {
  readonly lower: readonly number[];
  readonly upper: readonly number[];
  /** Null where the residuals do not exist. */
  evaluate(x: readonly number[]): Evaluation | null;
}

export type Stopped =
  /** No free unknown changes the sum any more. */
  | "flat"
  /** The step has become smaller than matters. */
  | "smallStep"
  /** Full steps make the sum smaller by less than matters. */
  | "smallGain"
  /** No shorter step makes the sum smaller. */
  | "noDescent"
  | "tooManyIterations";

export interface HeldUnknown {
  readonly unknown: number;
  readonly bound: "lower" | "upper";
}

export type LeastSquaresOutcome =
  | {
      readonly status: "found";
      readonly x: readonly number[];
      /** Sum of squares. */
      readonly cost: number;
      readonly stopped: Stopped;
      /** Which unknowns a bound holds against the descent. */
      readonly held: readonly HeldUnknown[];
      readonly iterations: number;
    }
  /** The residuals do not exist at the start. */
  | { readonly status: "noStart" };

const MOST_ITERATIONS = 100;
/** Relative to the size of r and of the column: round-off of a few hundred terms. */
const FLAT = 1e-10;
/** Of the range between the bounds. */
const SMALL_STEP = 1e-9;
/** Of the sum of squares; half the digits of the residuals' own round-off. */
const SMALL_GAIN = 1e-10;
const FIRST_DAMPING = 1e-3;
/** Damping under which a step is as good as the undamped one, so that a small gain means an end, not a brake. */
const LIGHT_DAMPING = 1e-2;
const MOST_DAMPING = 1e12;

/**
 * From `start` to the nearest constrained minimum. Each step minimises |J s + r|² + λ|D s|² over the unknowns that
 * no bound holds (D: the norms of J's columns), stays within the bounds, and is kept if the sum falls.
 * (K. Levenberg 1944, D. W. Marquardt 1963; the scaling by column norms after J. J. Moré, 1978.)
 */
export function solveLeastSquares(
  problem: LeastSquaresProblem,
  start: readonly number[],
): LeastSquaresOutcome {
  let x: readonly number[] = clamp(problem, start);
  let here = problem.evaluate(x);
  if (here === null) return { status: "noStart" };
  let cost = sumOfSquares(here.residuals);
  let lambda = FIRST_DAMPING;
  let stopped: Stopped = "tooManyIterations";
  let iterations = 0;
  for (; iterations < MOST_ITERATIONS; iterations++) {
    const free = freeUnknowns(problem, x, here);
    if (isFlat(here, free, cost)) {
      stopped = "flat";
      break;
    }
    const next = descend(problem, { x, here, cost, lambda }, free);
    if (next === null) {
      stopped = "noDescent";
      break;
    }
    const moved = largestShareOfRange(problem, x, next.x);
    const gain = (cost - next.cost) / cost;
    ({ x, here, cost, lambda } = next);
    if (moved < SMALL_STEP || (gain < SMALL_GAIN && lambda < LIGHT_DAMPING)) {
      stopped = moved < SMALL_STEP ? "smallStep" : "smallGain";
      break;
    }
  }
  return { status: "found", x, cost, stopped, held: heldUnknowns(problem, x, here), iterations };
}

interface Position {
  readonly x: readonly number[];
  readonly here: Evaluation;
  readonly cost: number;
  readonly lambda: number;
}

/** Raises the damping until a step makes the sum smaller; null when none does. */
function descend(problem: LeastSquaresProblem, from: Position, free: readonly number[]): Position | null {
  for (let lambda = from.lambda; lambda < MOST_DAMPING; lambda *= 10) {
    const x = boundedStep(problem, from, free, lambda);
    const there = problem.evaluate(x);
    if (there === null) continue;
    const cost = sumOfSquares(there.residuals);
    if (cost < from.cost) return { x, here: there, cost, lambda: lambda / 10 };
  }
  return null;
}

/**
 * The damped step of the free unknowns. One that would cross its bound goes just as far as the bound, and the
 * others are solved again with that part of the residuals done, so that they do not answer to a step never taken.
 */
function boundedStep(
  problem: LeastSquaresProblem,
  { x, here }: Position,
  free: readonly number[],
  lambda: number,
): number[] {
  const moved = [...x];
  const residuals = Float64Array.from(here.residuals);
  let open = free;
  while (open.length > 0) {
    const columns = open.map((unknown) => here.columns[unknown] as Float64Array);
    const damping = columns.map((column) => Math.sqrt(lambda * sumOfSquares(column)));
    const step = dampedStep(columns, residuals, damping);
    for (const [k, unknown] of open.entries()) moved[unknown] = (x[unknown] as number) + (step[k] as number);
    const bounded = clamp(problem, moved);
    const crossing = open.filter((unknown) => bounded[unknown] !== moved[unknown]);
    if (crossing.length === 0) break;
    for (const unknown of crossing) {
      moved[unknown] = bounded[unknown] as number;
      const done = (bounded[unknown] as number) - (x[unknown] as number);
      const column = here.columns[unknown] as Float64Array;
      for (let i = 0; i < residuals.length; i++)
        residuals[i] = (residuals[i] as number) + done * (column[i] as number);
    }
    open = open.filter((unknown) => !crossing.includes(unknown));
  }
  return moved;
}

function clamp(problem: LeastSquaresProblem, x: readonly number[]): number[] {
  return x.map((value, k) =>
    Math.min(problem.upper[k] as number, Math.max(problem.lower[k] as number, value)),
  );
}

function gradientOf(evaluation: Evaluation, unknown: number): number {
  const column = evaluation.columns[unknown] as Float64Array;
  return evaluation.residuals.reduce((sum, residual, i) => sum + residual * (column[i] as number), 0);
}

function heldUnknowns(problem: LeastSquaresProblem, x: readonly number[], here: Evaluation): HeldUnknown[] {
  return x.flatMap((value, unknown): HeldUnknown[] => {
    const gradient = gradientOf(here, unknown);
    const lower = problem.lower[unknown] as number;
    const upper = problem.upper[unknown] as number;
    if (value <= lower && gradient > 0) return [{ unknown, bound: "lower" }];
    if (value >= upper && gradient < 0) return [{ unknown, bound: "upper" }];
    return [];
  });
}

/** Unknowns that no bound holds and that change any residual at all. */
function freeUnknowns(problem: LeastSquaresProblem, x: readonly number[], here: Evaluation): number[] {
  const held = heldUnknowns(problem, x, here).map(({ unknown }) => unknown);
  return x
    .map((_, unknown) => unknown)
    .filter((unknown) => !held.includes(unknown) && sumOfSquares(here.columns[unknown] as Float64Array) > 0);
}

function isFlat(here: Evaluation, free: readonly number[], cost: number): boolean {
  return free.every((unknown) => {
    const norm = Math.sqrt(sumOfSquares(here.columns[unknown] as Float64Array));
    return Math.abs(gradientOf(here, unknown)) <= FLAT * norm * Math.sqrt(cost);
  });
}

function largestShareOfRange(
  problem: LeastSquaresProblem,
  a: readonly number[],
  b: readonly number[],
): number {
  return Math.max(
    ...a.map((value, k) => {
      const range = (problem.upper[k] as number) - (problem.lower[k] as number);
      return range > 0 ? Math.abs((b[k] as number) - value) / range : 0;
    }),
  );
}

function sumOfSquares(values: Float64Array): number {
  return values.reduce((sum, value) => sum + value * value, 0);
}
