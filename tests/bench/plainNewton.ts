// The plain way to solve a corner, for comparison only: Newton with a Jacobian by forward differences and a general
// matrix library, started from the pose before. Rotation vector and translation are the six unknowns.

import { type Axle, radFromDeg, rotate, rotationAbout } from "@linkwright/kinematics";
import { Matrix, solve } from "ml-matrix";

type Vec3 = readonly [number, number, number];

const DIFFERENCE = 1e-6;
const CLOSED = 1e-9;

/** Solves every travel of the left corner in turn; returns the number of poses closed. */
export function plainSweep(axle: Axle, travels: readonly number[]): number {
  let pose = [0, 0, 0, 0, 0, 0];
  let closed = 0;
  for (const travel of travels) {
    for (let iteration = 0; iteration < 20; iteration++) {
      const r = residuals(axle, pose, travel);
      if (Math.max(...r.map(Math.abs)) < CLOSED) {
        closed++;
        break;
      }
      const jacobian = Matrix.zeros(6, 6);
      for (let k = 0; k < 6; k++) {
        const moved = pose.map((value, other) => (other === k ? value + DIFFERENCE : value));
        const there = residuals(axle, moved, travel);
        for (let e = 0; e < 6; e++)
          jacobian.set(e, k, ((there[e] as number) - (r[e] as number)) / DIFFERENCE);
      }
      const step = solve(jacobian, Matrix.columnVector(r));
      pose = pose.map((value, k) => value - step.get(k, 0));
    }
  }
  return closed;
}

function residuals(axle: Axle, pose: readonly number[], travel: number): number[] {
  const { suspension, tieRod, wheel } = axle.left;
  const { lowerArm, upperArm } = suspension;
  const [wx, wy, wz, tx, ty, tz] = pose as [number, number, number, number, number, number];
  const angle = Math.hypot(wx, wy, wz);
  const rotation =
    angle === 0 ? ([1, 0, 0, 0] as const) : rotationAbout([wx, wy, wz], radFromDeg((angle * 180) / Math.PI));
  const place = (p: Vec3): Vec3 => {
    const turned = rotate(rotation, p);
    return [turned[0] + tx, turned[1] + ty, turned[2] + tz];
  };
  const link = (inner: Vec3, outer: Vec3) => distance(place(outer), inner) - distance(outer, inner);
  return [
    link(lowerArm.frontPivot, lowerArm.ballJoint),
    link(lowerArm.rearPivot, lowerArm.ballJoint),
    link(upperArm.frontPivot, upperArm.ballJoint),
    link(upperArm.rearPivot, upperArm.ballJoint),
    link(tieRod.inner, tieRod.outer),
    place(wheel.centre)[2] - wheel.centre[2] - travel,
  ];
}

function distance(a: Vec3, b: Vec3): number {
  return Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2]);
}
