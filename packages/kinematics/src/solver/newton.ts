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

import { DISTANCE, DRIVEN_POINT, EQUATIONS, PLANE, type PoseSystem, STRIDE } from "./constraints.ts";

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
    const next = evaluate(system);
    if (!(next <= CLOSURE || next <= CONTRACTION * residual)) return -1;
    residual = next;
  }
  return -1;
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
 * Gauss elimination with row pivoting of a 6 × 7 system in place, solution into `solution`, determinant into
 * report[0]. False when a pivot vanishes: the system is singular and `solution` is not written.
 */
export function eliminate(work: Float64Array, solution: Float64Array, report: Float64Array): boolean {
  let determinant = 1;
  for (let column = 0, diagonal = 0; column < EQUATIONS; column++, diagonal += WIDTH + 1) {
    const top = column * WIDTH;
    let pivotRow = top;
    let largest = Math.abs(work[diagonal] as number);
    for (let row = top + WIDTH; row < EQUATIONS * WIDTH; row += WIDTH) {
      const size = Math.abs(work[row + column] as number);
      if (size > largest) {
        largest = size;
        pivotRow = row;
      }
    }
    if (!(largest > 1e-13)) {
      report[0] = 0;
      return false;
    }
    if (pivotRow !== top) {
      determinant = -determinant;
      for (let k = column; k < WIDTH; k++) {
        const kept = work[top + k] as number;
        work[top + k] = work[pivotRow + k] as number;
        work[pivotRow + k] = kept;
      }
    }
    const pivot = work[diagonal] as number;
    determinant *= pivot;
    const inverse = 1 / pivot;
    for (let row = top + WIDTH; row < EQUATIONS * WIDTH; row += WIDTH) {
      const factor = (work[row + column] as number) * inverse;
      if (factor === 0) continue;
      for (let k = column + 1; k < WIDTH; k++) {
        work[row + k] = (work[row + k] as number) - factor * (work[top + k] as number);
      }
    }
  }
  for (let row = EQUATIONS - 1; row >= 0; row--) {
    const at = row * WIDTH;
    let sum = work[at + EQUATIONS] as number;
    for (let k = row + 1; k < EQUATIONS; k++) sum -= (work[at + k] as number) * (solution[k] as number);
    solution[row] = sum / (work[at + row] as number);
  }
  report[0] = determinant;
  return true;
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
