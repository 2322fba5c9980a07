// Find the flattest: the moves within their bounds that make bump steer least over all ride heights together.

import type { Axle } from "../../model/axle.ts";
import { type LeastSquaresOutcome, type Stopped, solveLeastSquares } from "../../solver/leastSquares.ts";
import { type Band, type BumpSteerFigures, bumpSteerCurves, worseOf } from "../bumpSteer.ts";
import { applyMove, type Move, whyNotMove } from "./moves.ts";
import { bumpSteerResiduals } from "./residuals.ts";

export interface FreeMove {
  readonly move: Move;
  /** mm from where the document has it. */
  readonly low: number;
  readonly high: number;
}

export interface FlattenRequest {
  readonly free: readonly FreeMove[];
  readonly heights: readonly Band[];
  /** Spacing of the points of a band, mm. */
  readonly step: number;
}

export interface HeightResult {
  readonly wheelUp: number;
  readonly before: BumpSteerFigures | null;
  readonly after: BumpSteerFigures | null;
}

export type FlattenOutcome =
  | {
      readonly status: "found";
      readonly moves: readonly { readonly move: Move; readonly mm: number }[];
      readonly heights: readonly HeightResult[];
      /** The document with the moves made. */
      readonly axle: Axle;
      readonly stopped: Stopped;
      /** Bounds that hold the answer: without them it would be flatter. */
      readonly heldBy: readonly { readonly move: Move; readonly bound: "low" | "high" }[];
    }
  | { readonly status: "refused"; readonly because: string };

/**
 * Bounded least squares of bump steer on analytic sensitivities, from the drawn position and from points spread
 * over the bounds, so that a valley behind a ridge is found too. Deterministic. The document is not changed.
 */
export function flatten(axle: Axle, { free, heights, step }: FlattenRequest): FlattenOutcome {
  const refusal = whyRefused(axle, free, heights);
  if (refusal !== null) return { status: "refused", because: refusal };
  const moves = free.map(({ move }) => move);
  const problem = {
    lower: free.map(({ low }) => low),
    upper: free.map(({ high }) => high),
    evaluate: (x: readonly number[]) => bumpSteerResiduals(applyMoves(axle, moves, x), moves, heights, step),
  };
  let best: Extract<LeastSquaresOutcome, { status: "found" }> | null = null;
  for (const start of starts(free)) {
    const outcome = solveLeastSquares(problem, start);
    if (outcome.status === "found" && (best === null || outcome.cost < best.cost * (1 - 1e-9)))
      best = outcome;
  }
  if (best === null)
    return { status: "refused", because: "A ride height cannot be reached as the axle is drawn." };
  const flattest = applyMoves(axle, moves, best.x);
  return {
    status: "found",
    moves: moves.map((move, k) => ({ move, mm: best.x[k] as number })),
    heights: heights.map((height) => ({
      wheelUp: height.wheelUp,
      before: worseOf(bumpSteerCurves(axle, height, step)),
      after: worseOf(bumpSteerCurves(flattest, height, step)),
    })),
    axle: flattest,
    stopped: best.stopped,
    heldBy: best.held.map(({ unknown, bound }) => ({
      move: moves[unknown] as Move,
      bound: bound === "lower" ? "low" : "high",
    })),
  };
}

export function applyMoves(axle: Axle, moves: readonly Move[], mm: readonly number[]): Axle {
  return moves.reduce((moved, move, k) => applyMove(moved, move, mm[k] as number), axle);
}

function whyRefused(axle: Axle, free: readonly FreeMove[], heights: readonly Band[]): string | null {
  if (free.length === 0) return "Choose at least one move.";
  if (heights.length === 0) return "Give at least one ride height with a band.";
  for (const { move, low, high } of free) {
    if (!(low <= 0 && high >= 0)) return "A move's bounds must hold 0, the drawn position.";
    const reason = whyNotMove(axle, move);
    if (reason !== null) return reason;
  }
  return null;
}

/** The drawn position, then two points a move, halfway to either bound with the others as drawn. */
function starts(free: readonly FreeMove[]): number[][] {
  const drawn = free.map(() => 0);
  return [
    drawn,
    ...free.flatMap(({ low, high }, k) =>
      [low, high].map((bound) => drawn.map((value, other) => (other === k ? bound / 2 : value))),
    ),
  ];
}
