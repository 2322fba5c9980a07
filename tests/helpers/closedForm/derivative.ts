// Derivatives by central differences of the second method itself.

/** mm. Three halvings below; the widest step reaches this far to both sides. */
const WIDEST_STEP = 1;

/**
 * d/dx of every entry of `f` at `x`: central differences at h, h/2 and h/4, extrapolated twice (Richardson), so that
 * what is left is of order h⁶. Null when `f` is null at any of the six places.
 */
export function differentiate(f: (x: number) => readonly number[] | null, x: number): number[] | null {
  const estimates: number[][] = [];
  for (const h of [WIDEST_STEP, WIDEST_STEP / 2, WIDEST_STEP / 4]) {
    const after = f(x + h);
    const before = f(x - h);
    if (after === null || before === null) return null;
    estimates.push(after.map((value, i) => (value - before[i]!) / (2 * h)));
  }
  const [wide, middle, narrow] = estimates as [number[], number[], number[]];
  return wide.map((_, i) => {
    const first = (4 * middle[i]! - wide[i]!) / 3;
    const second = (4 * narrow[i]! - middle[i]!) / 3;
    return (16 * second - first) / 15;
  });
}
