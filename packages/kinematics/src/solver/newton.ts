// The hot loop: Newton on a rigid body's pose. Written for the machine; nothing here allocates.
//
// Equation e stands at table[10 e …]:
//
//   kind              0..2            3..5                 6..8                     9
//   DISTANCE          car point b     knuckle point p_K    –                        length L
//   PLANE             car point b     knuckle point p_K    normal n_K               –
//   DRIVEN_POINT      –               knuckle point p_K    direction n_V            value
//   DRIVEN_DIRECTION  –               direction u_K        100 mm × direction n_V   100 mm × value
//
// work is 6 × 7: row e holds ∂r_e/∂(v₀, ω), then the right-hand side. A twist (v₀, ω) moves every point of the
// body that is at p by v₀ + ω × p, so the row of a link is its line's Plücker coordinates: direction, moment.

import {
  DISTANCE,
  DRIVEN_DIRECTION,
  DRIVEN_POINT,
  EQUATIONS,
  PLANE,
  type PoseSystem,
  STRIDE,
} from "./constraints.ts";
import { eliminate } from "./eliminate.ts";

/** mm. Larger loses digits of toe (0.1 µrad needs 1e-5 mm at 100 mm); smaller meets round-off at 5 m. */
export const CLOSURE = 1e-10;

/** A quadratic method that needs more is not where it should be. */
const MOST_ITERATIONS = 12;

/**
 * A Newton step must shrink the largest residual at least to this share, else the start was too far off. Larger
 * lets the pose slip to another assembly; smaller only shortens the steps of the continuation.
 */
const CONTRACTION = 0.1;

const WIDTH = EQUATIONS + 1;

/**
 * Moves `system.pose` on to the nearest solution. Returns the number of eliminations, or −1 when a step did not
 * contract or the Jacobian was singular; the pose is then worthless. `startLimit` (mm) refuses a start whose
 * residual is larger.
 */
export function solvePose(system: PoseSystem, startLimit = Number.POSITIVE_INFINITY): number {
  const { step, report } = system;
  let residual = evaluate(system);
  if (!(residual <= startLimit)) return -1;
  for (let iteration = 0; iteration < MOST_ITERATIONS; iteration++) {
    if (residual <= CLOSURE) return iteration;
    if (!eliminate(system.work, step, report)) return -1;
    applyTwist(system.pose, step);
    // Most poses are closed by now: look before the Jacobian is worked out again.
    const next = misclosure(system);
    if (next <= CLOSURE) return iteration + 1;
    if (!(next <= CONTRACTION * residual)) return -1;
    residual = evaluate(system);
  }
  return -1;
}

/** The largest |r| at the present pose in mm, as evaluate finds it, without the Jacobian: half its time. */
export function misclosure(system: PoseSystem): number {
  const { kinds, table, pose } = system;
  const qw = pose[0] as number;
  const qx = pose[1] as number;
  const qy = pose[2] as number;
  const qz = pose[3] as number;
  const r00 = 1 - 2 * (qy * qy + qz * qz);
  const r01 = 2 * (qx * qy - qw * qz);
  const r02 = 2 * (qx * qz + qw * qy);
  const r10 = 2 * (qx * qy + qw * qz);
  const r11 = 1 - 2 * (qx * qx + qz * qz);
  const r12 = 2 * (qy * qz - qw * qx);
  const r20 = 2 * (qx * qz - qw * qy);
  const r21 = 2 * (qy * qz + qw * qx);
  const r22 = 1 - 2 * (qx * qx + qy * qy);
  const tx = pose[4] as number;
  const ty = pose[5] as number;
  const tz = pose[6] as number;
  let largest = 0;
  for (let e = 0, at = 0; e < EQUATIONS; e++, at += STRIDE) {
    const kind = kinds[e] as number;
    const kx = table[at + 3] as number;
    const ky = table[at + 4] as number;
    const kz = table[at + 5] as number;
    // From the car's point to the knuckle's; a drive has its car point at the origin.
    let dx = r00 * kx + r01 * ky + r02 * kz - (table[at] as number);
    let dy = r10 * kx + r11 * ky + r12 * kz - (table[at + 1] as number);
    let dz = r20 * kx + r21 * ky + r22 * kz - (table[at + 2] as number);
    if (kind !== DRIVEN_DIRECTION) {
      dx += tx;
      dy += ty;
      dz += tz;
    }
    const value = table[at + 9] as number;
    let residual: number;
    if (kind === DISTANCE) {
      residual = ((dx * dx + dy * dy + dz * dz) / value - value) / 2;
    } else {
      let nx = table[at + 6] as number;
      let ny = table[at + 7] as number;
      let nz = table[at + 8] as number;
      if (kind === PLANE) {
        const ax = nx;
        const ay = ny;
        nx = r00 * ax + r01 * ay + r02 * nz;
        ny = r10 * ax + r11 * ay + r12 * nz;
        nz = r20 * ax + r21 * ay + r22 * nz;
      }
      residual = nx * dx + ny * dy + nz * dz - value;
    }
    if (!(Math.abs(residual) <= largest)) largest = Math.abs(residual);
  }
  system.report[1] = largest;
  return largest;
}

/**
 * Fills `work` with the Jacobian and −r at the present pose; returns the largest |r| in mm.
 * A link: r = (|d|² − L²) / 2L, which is |d| − L to first order and smooth everywhere. A plane: r = n·(p − b).
 * A driven point: r = n·p − value. A driven direction: r = n·u − value.
 */
export function evaluate(system: PoseSystem): number {
  const { kinds, table, pose, work } = system;
  const qw = pose[0] as number;
  const qx = pose[1] as number;
  const qy = pose[2] as number;
  const qz = pose[3] as number;
  const r00 = 1 - 2 * (qy * qy + qz * qz);
  const r01 = 2 * (qx * qy - qw * qz);
  const r02 = 2 * (qx * qz + qw * qy);
  const r10 = 2 * (qx * qy + qw * qz);
  const r11 = 1 - 2 * (qx * qx + qz * qz);
  const r12 = 2 * (qy * qz - qw * qx);
  const r20 = 2 * (qx * qz - qw * qy);
  const r21 = 2 * (qy * qz + qw * qx);
  const r22 = 1 - 2 * (qx * qx + qy * qy);
  const tx = pose[4] as number;
  const ty = pose[5] as number;
  const tz = pose[6] as number;
  let largest = 0;
  for (let e = 0, at = 0, row = 0; e < EQUATIONS; e++, at += STRIDE, row += WIDTH) {
    const kind = kinds[e] as number;
    const bx = table[at] as number;
    const by = table[at + 1] as number;
    const bz = table[at + 2] as number;
    const kx = table[at + 3] as number;
    const ky = table[at + 4] as number;
    const kz = table[at + 5] as number;
    // The knuckle point, or direction, turned into V.
    const ux = r00 * kx + r01 * ky + r02 * kz;
    const uy = r10 * kx + r11 * ky + r12 * kz;
    const uz = r20 * kx + r21 * ky + r22 * kz;
    let lx: number; // direction of the line
    let ly: number;
    let lz: number;
    let px: number; // a point on it
    let py: number;
    let pz: number;
    let residual: number;
    if (kind === DISTANCE) {
      const length = table[at + 9] as number;
      const dx = ux + tx - bx;
      const dy = uy + ty - by;
      const dz = uz + tz - bz;
      lx = dx / length;
      ly = dy / length;
      lz = dz / length;
      residual = (dx * lx + dy * ly + dz * lz - length) / 2;
      px = bx;
      py = by;
      pz = bz;
    } else if (kind === PLANE) {
      const nx = table[at + 6] as number;
      const ny = table[at + 7] as number;
      const nz = table[at + 8] as number;
      lx = r00 * nx + r01 * ny + r02 * nz;
      ly = r10 * nx + r11 * ny + r12 * nz;
      lz = r20 * nx + r21 * ny + r22 * nz;
      residual = lx * (ux + tx - bx) + ly * (uy + ty - by) + lz * (uz + tz - bz);
      px = bx;
      py = by;
      pz = bz;
    } else {
      lx = table[at + 6] as number;
      ly = table[at + 7] as number;
      lz = table[at + 8] as number;
      px = ux;
      py = uy;
      pz = uz;
      if (kind === DRIVEN_POINT) {
        px += tx;
        py += ty;
        pz += tz;
      }
      residual = lx * px + ly * py + lz * pz - (table[at + 9] as number);
    }
    // A direction does not move with the body, it only turns.
    const moves = kind === DISTANCE || kind === PLANE || kind === DRIVEN_POINT ? 1 : 0;
    work[row] = lx * moves;
    work[row + 1] = ly * moves;
    work[row + 2] = lz * moves;
    work[row + 3] = py * lz - pz * ly;
    work[row + 4] = pz * lx - px * lz;
    work[row + 5] = px * ly - py * lx;
    work[row + 6] = -residual;
    // Written so that NaN becomes the largest.
    if (!(Math.abs(residual) <= largest)) largest = Math.abs(residual);
  }
  system.report[1] = largest;
  return largest;
}

/**
 * X_VK ← exp(ξ)·X_VK, with the Cayley map for exp: the unit quaternion of (1, ω/2) agrees with it to second
 * order, which Newton needs no better, and takes one root. v₀ is added after the turn about V's origin.
 */
export function applyTwist(pose: Float64Array, twist: Float64Array): void {
  let hx = (twist[3] as number) / 2;
  let hy = (twist[4] as number) / 2;
  let hz = (twist[5] as number) / 2;
  const w = 1 / Math.sqrt(1 + hx * hx + hy * hy + hz * hz);
  hx *= w;
  hy *= w;
  hz *= w;
  const qw = pose[0] as number;
  const qx = pose[1] as number;
  const qy = pose[2] as number;
  const qz = pose[3] as number;
  const nw = w * qw - hx * qx - hy * qy - hz * qz;
  const nx = w * qx + hx * qw + hy * qz - hz * qy;
  const ny = w * qy - hx * qz + hy * qw + hz * qx;
  const nz = w * qz + hx * qy - hy * qx + hz * qw;
  // One step of Newton's root for 1/√s keeps the quaternion unit: s differs from 1 by round-off only.
  const unit = 1.5 - 0.5 * (nw * nw + nx * nx + ny * ny + nz * nz);
  pose[0] = nw * unit;
  pose[1] = nx * unit;
  pose[2] = ny * unit;
  pose[3] = nz * unit;
  const tx = pose[4] as number;
  const ty = pose[5] as number;
  const tz = pose[6] as number;
  const cx = 2 * (hy * tz - hz * ty);
  const cy = 2 * (hz * tx - hx * tz);
  const cz = 2 * (hx * ty - hy * tx);
  pose[4] = tx + w * cx + hy * cz - hz * cy + (twist[0] as number);
  pose[5] = ty + w * cy + hz * cx - hx * cz + (twist[1] as number);
  pose[6] = tz + w * cz + hx * cy - hy * cx + (twist[2] as number);
}
