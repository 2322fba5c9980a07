// Every target of a study at every ride height: the value furthest from being allowed, and whether it is.

import {
  type Axle,
  type BumpSteerCurve,
  bumpSteerCurves,
  type RideHeight,
  SIDES,
  type Side,
  type SideRow,
  type Sweep,
  steeringLock,
  sweepAxle,
  type Target,
  type TargetQuantity,
} from "@linkwright/kinematics";

export type Verdict = "inside" | "below" | "above" | "unknown";

export interface Judgement {
  readonly target: Target;
  readonly verdict: Verdict;
  /** In the target's own unit; null when there is none to judge. */
  readonly value: number | null;
  /** How far outside, or how far inside the nearer bound; null when unknown. */
  readonly by: number | null;
  readonly height: string;
  /** Null for what both sides make together. */
  readonly side: Side | null;
}

/** mm between the points of a band. */
export const BAND_STEP = 5;

/** The worst of all ride heights for each target, in the targets' order. */
export function judgeTargets(
  axle: Axle,
  heights: readonly RideHeight[],
  targets: readonly Target[],
): Judgement[] {
  if (targets.length === 0) return [];
  const asked = new Set(targets.map(({ quantity }) => quantity));
  const measured = heights.map((height) => ({ height, candidates: measureHeight(axle, height, asked) }));
  return targets.flatMap((target) => {
    const all = measured.flatMap(({ height, candidates }) =>
      (candidates.get(target.quantity) ?? []).map((candidate) => judge(target, candidate, height.name)),
    );
    return worstOf(all) ?? [];
  });
}

export interface Candidate {
  readonly value: number | null;
  readonly side: Side | null;
}

export function judge(target: Target, { value, side }: Candidate, height: string): Judgement {
  const common = { target, value, height, side };
  if (value === null) return { ...common, verdict: "unknown", by: null };
  const { min, max } = target;
  if (min !== null && value < min) return { ...common, verdict: "below", by: min - value };
  if (max !== null && value > max) return { ...common, verdict: "above", by: value - max };
  return {
    ...common,
    verdict: "inside",
    by: Math.min(value - (min ?? -Infinity), (max ?? Infinity) - value),
  };
}

const RANK: Readonly<Record<Verdict, number>> = { inside: 0, unknown: 1, below: 2, above: 2 };

function isWorse(a: Judgement, b: Judgement): boolean {
  if (RANK[a.verdict] !== RANK[b.verdict]) return RANK[a.verdict] > RANK[b.verdict];
  if (a.by === null || b.by === null) return false;
  return a.verdict === "inside" ? a.by < b.by : a.by > b.by;
}

export function worstOf(judgements: readonly Judgement[]): Judgement | null {
  return judgements.reduce<Judgement | null>(
    (worst, next) => (worst === null || isWorse(next, worst) ? next : worst),
    null,
  );
}

/** The extremes of a band, each side by itself. */
export function bandCandidates(curves: readonly BumpSteerCurve[]): Candidate[] {
  return curves.flatMap(({ side, bumpSteerDeg }): Candidate[] =>
    bumpSteerDeg.length === 0
      ? [{ side, value: null }]
      : [
          { side, value: Math.min(...bumpSteerDeg) },
          { side, value: Math.max(...bumpSteerDeg) },
        ],
  );
}

type Candidates = ReadonlyMap<TargetQuantity, readonly Candidate[]>;

function measureHeight(axle: Axle, height: RideHeight, asked: ReadonlySet<TargetQuantity>): Candidates {
  const { wheelUp } = height;
  const lock = steeringLock(axle.steering);
  const isSteered = asked.has("ackermannPercent") && lock > 0;
  const steers = isSteered ? [0, lock, -lock] : [0];
  const sweep = sweepAxle(axle, { travels: [wheelUp], steers, wheelUp });
  return new Map([...asked].map((quantity) => [quantity, candidatesFor(quantity, { axle, height, sweep })]));
}

interface Measured {
  readonly axle: Axle;
  readonly height: RideHeight;
  readonly sweep: Sweep;
}

function candidatesFor(quantity: TargetQuantity, { axle, height, sweep }: Measured): Candidate[] {
  const straight = sweep.rows.find(({ steer }) => steer === 0);
  const ofSides = (read: (row: SideRow) => number | null) =>
    SIDES.map((side): Candidate => {
      const row = straight?.[side] ?? null;
      return { side, value: row && read(row) };
    });
  switch (quantity) {
    case "bumpSteerDeg":
      return bandCandidates(bumpSteerCurves(axle, height, BAND_STEP));
    case "track":
    case "rollCentreHeight":
      return [{ side: null, value: straight?.axle[quantity] ?? null }];
    case "ackermannPercent":
      return ackermannAtLocks(sweep);
    default:
      return ofSides((row) => row[quantity]);
  }
}

function ackermannAtLocks({ rows }: Sweep): Candidate[] {
  const locks = rows.filter(({ steer }) => steer !== 0);
  if (locks.length === 0) return [{ side: null, value: null }];
  return locks.map(({ axle }) => ({ side: null, value: axle.ackermannPercent }));
}
