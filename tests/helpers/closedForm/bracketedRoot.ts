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
 * The first root of `f` met when walking from 0 by strides of `step`; null when `f` ends (returns null), turns back
 * before it meets 0, or the walk reaches `furthest`. Where the next stride would do any of these it is halved, down to
 * 1e-12, so that a root just before the end or the turning point is not missed.
 */
export function findFirstRoot(
  f: (x: number) => number | null,
  step: number,
  furthest: number,
): number | null {
  let atHere = f(0);
  if (atHere === null) return null;
  let here = 0;
  let stride = step;
  while (atHere !== 0 && Math.abs(here) < furthest) {
    const next = here + stride;
    const atNext = f(next);
    if (atNext !== null && atNext > 0 !== atHere > 0) {
      return findBracketedRoot((x) => f(x) ?? Number.NaN, here, next);
    }
    if (atNext === null || Math.abs(atNext) >= Math.abs(atHere)) {
      if (Math.abs(stride) < 1e-12) return null;
      stride /= 2;
      continue;
    }
    here = next;
    atHere = atNext;
  }
  return atHere === 0 ? here : null;
}
