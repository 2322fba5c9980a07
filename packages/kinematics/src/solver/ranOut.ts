// Which row ended a path: at the end the Jacobian is singular, and the left null vector tells who holds it.

import { EQUATIONS, type PoseSystem } from "./constraints.ts";
import { smallestSingular } from "./linalg.ts";
import { evaluate } from "./newton.ts";

/** mm. Moments are divided by an arm of a car's size, so that they weigh like forces in the decomposition. */
const MOMENT_ARM = 200;

/**
 * The row whose change in length would carry the end furthest, per mm: at a turning point of r(x, z, L) = 0 with
 * λᵀ ∂r/∂x = 0, dz/dL_i = −λ_i ∂r_i/∂L_i / (λᵀ ∂r/∂z), so it is the one with the largest |λ_i|. Rows named in
 * `except` (the drives) are left out.
 */
export function rowThatRanOut(system: PoseSystem, except: readonly string[]): string {
  evaluate(system);
  const rows = Array.from({ length: EQUATIONS }, (_, e) =>
    Array.from({ length: EQUATIONS }, (_, k) => {
      const entry = system.work[e * (EQUATIONS + 1) + k] as number;
      return k < 3 ? entry : entry / MOMENT_ARM;
    }),
  );
  const { left } = smallestSingular(rows);
  let name = "";
  let largest = -1;
  for (const [e, weight] of left.entries()) {
    const row = system.names[e] as string;
    if (except.includes(row) || Math.abs(weight) <= largest) continue;
    largest = Math.abs(weight);
    name = row;
  }
  return name;
}
