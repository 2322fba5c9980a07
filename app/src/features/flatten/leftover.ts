// What is left of a curve: the straight line and the parabola that fit it best, and what neither of them explains.

export interface Leftover {
  /** ° per mm of travel, toe-in in bump positive. */
  readonly slopeDegPerMm: number;
  /** ° by which the ends of the band stand off its middle, the slope taken out; toe-in positive. */
  readonly bowDeg: number;
  /** Greatest distance of a point from the fitted parabola. */
  readonly restDeg: number;
  readonly kind: "nothing" | "slope" | "bow" | "rest";
}

/** Degrees: less than a shop can measure. */
const UNMEASURABLE = 0.002;

/** Null for a curve with too few points to fit. */
export function fitLeftover(travels: readonly number[], bumpSteerDeg: readonly number[]): Leftover | null {
  const [first, last] = [travels[0], travels.at(-1)];
  if (first === undefined || last === undefined || travels.length < 4 || last <= first) return null;
  const middle = (first + last) / 2;
  const half = (last - first) / 2;
  const t = travels.map((travel) => (travel - middle) / half);
  const [constant, linear, square] = fitParabola(t, bumpSteerDeg);
  const restDeg = Math.max(
    ...bumpSteerDeg.map((value, at) => {
      const place = t[at] as number;
      return Math.abs(value - constant - linear * place - square * place * place);
    }),
  );
  const shares = { slope: 2 * Math.abs(linear), bow: Math.abs(square), rest: 2 * restDeg };
  return { slopeDegPerMm: linear / half, bowDeg: square, restDeg, kind: largest(shares) };
}

function largest(shares: Readonly<Record<"slope" | "bow" | "rest", number>>): Leftover["kind"] {
  const kinds = ["slope", "bow", "rest"] as const;
  const kind = kinds.reduce((most, next) => (shares[next] > shares[most] ? next : most));
  return shares[kind] < UNMEASURABLE ? "nothing" : kind;
}

/**
 * Least squares of y on 1, t, t² by Gram–Schmidt over the given points: with t within ±1 the three are far from
 * parallel, so no pivoting is needed.
 */
function fitParabola(t: readonly number[], y: readonly number[]): readonly [number, number, number] {
  const ones = t.map(() => 1);
  const line = t.map((value) => value - share(t, ones));
  const raised = t.map((value) => value * value);
  const [raisedOnOnes, raisedOnLine] = [share(raised, ones), share(raised, line)];
  const curve = raised.map((value, at) => value - raisedOnOnes - raisedOnLine * (line[at] as number));
  const square = share(y, curve);
  const linear = share(y, line) - square * raisedOnLine;
  const mean = share(y, ones);
  const constant = mean - linear * share(t, ones) - square * raisedOnOnes;
  return [constant, linear, square];
}

/** How much of `along` there is in `vector`. */
function share(vector: readonly number[], along: readonly number[]): number {
  const product = (a: readonly number[], b: readonly number[]) =>
    a.reduce((sum, value, at) => sum + value * (b[at] as number), 0);
  return product(vector, along) / product(along, along);
}
