// Root finding that never leaves its bracket: slow beside Newton, and independent of it.

/**
 * A root of `f` between `low` and `high`, where it changes sign, to the last bits of a double.
 * Regula falsi with the Illinois halving; a bisection whenever that has not halved the bracket in two steps.
 */
export function findBracketedRoot(f: (x: number) => number, low: number, high: number): number {
  let [a, fa, b, fb] = [low, f(low), high, f(high)];
  if (fa === 0) return a;
  if (fb === 0) return b;
  let widthTwoStepsAgo = Number.POSITIVE_INFINITY;
  for (let step = 0; step < 400; step++) {
    const width = Math.abs(b - a);
    const bisect = step % 2 === 1 && width > widthTwoStepsAgo / 2;
    if (step % 2 === 1) widthTwoStepsAgo = width;
    const x = bisect ? (a + b) / 2 : b - (fb * (b - a)) / (fb - fa);
    const fx = f(x);
    if (fx === 0 || width < 1e-16 + 4e-16 * Math.abs(x)) return x;
    if (fx > 0 !== fb > 0) {
      [a, fa] = [b, fb];
    } else if (!bisect) {
      fa /= 2;
    }
    [b, fb] = [x, fx];
  }
  return b;
}

/**
 * The first root of `f` met when walking from 0 towards `step`'s sign; null when `f` ends (returns null) or the walk
 * reaches `furthest` before. `f` may end between two steps: the last stretch is walked to within 1e-12.
 */
export function findFirstRoot(
  f: (x: number) => number | null,
  step: number,
  furthest: number,
): number | null {
  const atStart = f(0);
  if (atStart === null) return null;
  if (atStart === 0) return 0;
  let here = 0;
  let stride = step;
  while (Math.abs(here) < furthest) {
    const next = here + stride;
    const atNext = f(next);
    if (atNext === null) {
      if (Math.abs(stride) < 1e-12) return null;
      stride /= 2;
      continue;
    }
    if (atNext > 0 !== atStart > 0) {
      return findBracketedRoot((x) => f(x) ?? Number.NaN, here, next);
    }
    here = next;
  }
  return null;
}
