// How much of true rolling the steering gives in a turn.

import { type Deg, degFromRad, radFromDeg } from "../units.ts";
import { type Measured, measured, unmeasured } from "./measured.ts";

/** ° of mean steer. Both differences shrink with its square: nearer to straight, round-off shows in the ratio. */
const STRAIGHT_WITHIN_DEG = 0.01;

/**
 * 100·(δi − δo)/(δi − δo*), with cot δo* = cot δi + d/L: 100 % is true rolling, 0 is parallel steer. δ: steer of
 * the inner and the outer wheel, `d` between the steering axes at the ground straight ahead, `L` the wheelbase.
 * The inner wheel is told by the sign of the mean steer. (R. S. Khurmi & J. K. Gupta, Theory of Machines, ch. 9;
 * the percentage is the trade's.)
 */
export function measureAckermannPercent(
  leftSteerDeg: Deg,
  rightSteerDeg: Deg,
  groundPointsApart: number,
  wheelbase: number,
): Measured {
  const meanDeg = (leftSteerDeg + rightSteerDeg) / 2;
  if (Math.abs(meanDeg) < STRAIGHT_WITHIN_DEG) return unmeasured("straight ahead there is no inner wheel");
  const innerDeg = meanDeg > 0 ? leftSteerDeg : -rightSteerDeg;
  const outerDeg = meanDeg > 0 ? rightSteerDeg : -leftSteerDeg;
  const innerRad = radFromDeg(innerDeg);
  if (Math.sin(innerRad) <= 0) return unmeasured("the inner wheel does not steer into the turn");
  const cotOuter = Math.cos(innerRad) / Math.sin(innerRad) + groundPointsApart / wheelbase;
  const idealOuterDeg = degFromRad(Math.atan2(1, cotOuter));
  return measured((100 * (innerDeg - outerDeg)) / (innerDeg - idealOuterDeg));
}
