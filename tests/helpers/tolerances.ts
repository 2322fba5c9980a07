// Every tolerance a test may use: what it is, in which unit, and why it is neither larger nor smaller.

export interface Tolerance {
  readonly name: string;
  readonly value: number;
  readonly unit: string;
  readonly reason: string;
}

export const TOLERANCE = {
  roundOff: {
    name: "roundOff",
    value: 1e-10,
    unit: "degrees or mm",
    reason:
      "the same sum in another order: doubles of size 1000 carry 1e-13, a solve multiplies that a few hundredfold",
  },
  closure: {
    name: "closure",
    value: 1e-9,
    unit: "mm",
    reason:
      "a link that is solved for keeps its length; more than this would show that iteration stopped early",
  },
  solve: {
    name: "solve",
    value: 1e-8,
    unit: "degrees or mm",
    reason:
      "two solves of one pose, each closed to 1e-10 mm, measured up to some metres and some tens of gain away",
  },
  referenceDeg: {
    name: "referenceDeg",
    value: 1e-6,
    unit: "degrees",
    reason: "agreed with the independent solutions; a gauge on the car reads 1e-2",
  },
  referenceMm: {
    name: "referenceMm",
    value: 1e-6,
    unit: "mm",
    reason: "agreed with the independent solutions",
  },
  referenceGroundMm: {
    name: "referenceGroundMm",
    value: 1e-5,
    unit: "mm",
    reason:
      "trail and scrub radius: the steering axis is prolonged to the ground, which enlarges what a joint is off by",
  },
  referenceGradient: {
    name: "referenceGradient",
    value: 1e-8,
    unit: "degrees or mm per mm",
    reason:
      "an extrapolated central difference of the second method is good to about 1e-10; 1e-8 over 100 mm is 1e-6",
  },
  referencePercent: {
    name: "referencePercent",
    value: 1e-5,
    unit: "%",
    reason: "a hundred times a ratio of gradients times wheelbase over cg height, or of steer angles",
  },
  finiteDifference: {
    name: "finiteDifference",
    value: 2e-8,
    unit: "relative to the larger of 1 and the value",
    reason:
      "a central difference with step ∛ε errs by ε/h + h² f‴ ≈ 4e-11 f‴ plus round-off of the solve over h",
  },
} as const satisfies Record<string, Tolerance>;

/** Half a unit in the last printed digit of a source, and nothing more. */
export function printedTo(decimals: number, unit: string): Tolerance {
  return {
    name: `printedTo(${decimals})`,
    // A hair over the half, so that a value that lies exactly on it is not lost to binary fractions.
    value: 0.5000001 * 10 ** -decimals,
    unit,
    reason: `the source prints ${decimals} decimals`,
  };
}

/** For the one case where a source states how far its own value is good. */
export function asStated(value: number, unit: string, reason: string): Tolerance {
  return { name: "asStated", value, unit, reason };
}
