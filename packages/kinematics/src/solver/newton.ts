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
const SIZE = EQUATIONS * WIDTH;

/** mm or 1. A pivot this small is round-off of rows whose entries are 1 (directions) and 100 … 1000 (moments). */
const SMALLEST_PIVOT = 1e-13;

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
  const tx = pose[4] as number;
  const ty = pose[5] as number;
  const tz = pose[6] as number;
  let largest = 0;
  for (let e = 0, at = 0; e < EQUATIONS; e++, at += STRIDE) {
    const kind = kinds[e] as number;
    const kx = table[at + 3] as number;
    const ky = table[at + 4] as number;
    const kz = table[at + 5] as number;
    // q × p, twice: p + 2w(q × p) + 2 q × (q × p).
    const cx = 2 * (qy * kz - qz * ky);
    const cy = 2 * (qz * kx - qx * kz);
    const cz = 2 * (qx * ky - qy * kx);
    const ux = kx + qw * cx + qy * cz - qz * cy;
    const uy = ky + qw * cy + qz * cx - qx * cz;
    const uz = kz + qw * cz + qx * cy - qy * cx;
    let residual: number;
    if (kind === DISTANCE) {
      const dx = ux + tx - (table[at] as number);
      const dy = uy + ty - (table[at + 1] as number);
      const dz = uz + tz - (table[at + 2] as number);
      const length = table[at + 9] as number;
      residual = ((dx * dx + dy * dy + dz * dz) / length - length) / 2;
    } else {
      residual = otherResidual(system, e, ux, uy, uz);
    }
    if (!(Math.abs(residual) <= largest)) largest = Math.abs(residual);
  }
  system.report[1] = largest;
  return largest;
}

/** r of a plane or a drive, whose knuckle point or direction has been turned to (ux, uy, uz). */
function otherResidual(system: PoseSystem, e: number, ux: number, uy: number, uz: number): number {
  const { kinds, table, pose } = system;
  const at = e * STRIDE;
  let nx = table[at + 6] as number;
  let ny = table[at + 7] as number;
  let nz = table[at + 8] as number;
  const kind = kinds[e] as number;
  if (kind === DRIVEN_DIRECTION) return nx * ux + ny * uy + nz * uz - (table[at + 9] as number);
  const x = ux + (pose[4] as number);
  const y = uy + (pose[5] as number);
  const z = uz + (pose[6] as number);
  if (kind === DRIVEN_POINT) return nx * x + ny * y + nz * z - (table[at + 9] as number);
  const qw = pose[0] as number;
  const qx = pose[1] as number;
  const qy = pose[2] as number;
  const qz = pose[3] as number;
  const cx = 2 * (qy * nz - qz * ny);
  const cy = 2 * (qz * nx - qx * nz);
  const cz = 2 * (qx * ny - qy * nx);
  nx += qw * cx + qy * cz - qz * cy;
  ny += qw * cy + qz * cx - qx * cz;
  nz += qw * cz + qx * cy - qy * cx;
  return (
    nx * (x - (table[at] as number)) +
    ny * (y - (table[at + 1] as number)) +
    nz * (z - (table[at + 2] as number))
  );
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
 *
 * The columns are written out, for the pivot row then stays in registers: three times as fast as loops.
 */
export function eliminate(work: Float64Array, solution: Float64Array, report: Float64Array): boolean {
  let sign = 1;
  // Column 0.
  sign *= bringUpPivot(work, 0);
  const d0 = work[0] as number;
  if (!(Math.abs(d0) > SMALLEST_PIVOT)) return singular(report);
  const i0 = 1 / d0;
  const u01 = work[1] as number;
  const u02 = work[2] as number;
  const u03 = work[3] as number;
  const u04 = work[4] as number;
  const u05 = work[5] as number;
  const u06 = work[6] as number;
  for (let row = 7; row < SIZE; row += WIDTH) {
    const factor = (work[row] as number) * i0;
    work[row + 1] = (work[row + 1] as number) - factor * u01;
    work[row + 2] = (work[row + 2] as number) - factor * u02;
    work[row + 3] = (work[row + 3] as number) - factor * u03;
    work[row + 4] = (work[row + 4] as number) - factor * u04;
    work[row + 5] = (work[row + 5] as number) - factor * u05;
    work[row + 6] = (work[row + 6] as number) - factor * u06;
  }
  // Column 1.
  sign *= bringUpPivot(work, 1);
  const d1 = work[8] as number;
  if (!(Math.abs(d1) > SMALLEST_PIVOT)) return singular(report);
  const i1 = 1 / d1;
  const u12 = work[9] as number;
  const u13 = work[10] as number;
  const u14 = work[11] as number;
  const u15 = work[12] as number;
  const u16 = work[13] as number;
  for (let row = 14; row < SIZE; row += WIDTH) {
    const factor = (work[row + 1] as number) * i1;
    work[row + 2] = (work[row + 2] as number) - factor * u12;
    work[row + 3] = (work[row + 3] as number) - factor * u13;
    work[row + 4] = (work[row + 4] as number) - factor * u14;
    work[row + 5] = (work[row + 5] as number) - factor * u15;
    work[row + 6] = (work[row + 6] as number) - factor * u16;
  }
  // Column 2.
  sign *= bringUpPivot(work, 2);
  const d2 = work[16] as number;
  if (!(Math.abs(d2) > SMALLEST_PIVOT)) return singular(report);
  const i2 = 1 / d2;
  const u23 = work[17] as number;
  const u24 = work[18] as number;
  const u25 = work[19] as number;
  const u26 = work[20] as number;
  for (let row = 21; row < SIZE; row += WIDTH) {
    const factor = (work[row + 2] as number) * i2;
    work[row + 3] = (work[row + 3] as number) - factor * u23;
    work[row + 4] = (work[row + 4] as number) - factor * u24;
    work[row + 5] = (work[row + 5] as number) - factor * u25;
    work[row + 6] = (work[row + 6] as number) - factor * u26;
  }
  // Column 3.
  sign *= bringUpPivot(work, 3);
  const d3 = work[24] as number;
  if (!(Math.abs(d3) > SMALLEST_PIVOT)) return singular(report);
  const i3 = 1 / d3;
  const u34 = work[25] as number;
  const u35 = work[26] as number;
  const u36 = work[27] as number;
  for (let row = 28; row < SIZE; row += WIDTH) {
    const factor = (work[row + 3] as number) * i3;
    work[row + 4] = (work[row + 4] as number) - factor * u34;
    work[row + 5] = (work[row + 5] as number) - factor * u35;
    work[row + 6] = (work[row + 6] as number) - factor * u36;
  }
  // Column 4.
  sign *= bringUpPivot(work, 4);
  const d4 = work[32] as number;
  if (!(Math.abs(d4) > SMALLEST_PIVOT)) return singular(report);
  const i4 = 1 / d4;
  const u45 = work[33] as number;
  const u46 = work[34] as number;
  for (let row = 35; row < SIZE; row += WIDTH) {
    const factor = (work[row + 4] as number) * i4;
    work[row + 5] = (work[row + 5] as number) - factor * u45;
    work[row + 6] = (work[row + 6] as number) - factor * u46;
  }
  // Column 5, then back up.
  const d5 = work[40] as number;
  if (!(Math.abs(d5) > SMALLEST_PIVOT)) return singular(report);
  const x5 = (work[41] as number) / d5;
  const x4 = (u46 - u45 * x5) * i4;
  const x3 = (u36 - u34 * x4 - u35 * x5) * i3;
  const x2 = (u26 - u23 * x3 - u24 * x4 - u25 * x5) * i2;
  const x1 = (u16 - u12 * x2 - u13 * x3 - u14 * x4 - u15 * x5) * i1;
  const x0 = (u06 - u01 * x1 - u02 * x2 - u03 * x3 - u04 * x4 - u05 * x5) * i0;
  solution[0] = x0;
  solution[1] = x1;
  solution[2] = x2;
  solution[3] = x3;
  solution[4] = x4;
  solution[5] = x5;
  report[0] = sign * d0 * d1 * d2 * d3 * d4 * d5;
  return true;
}

/** Exchanges row `column` with the one below it that has the largest entry there; −1 when it did, else 1. */
function bringUpPivot(work: Float64Array, column: number): 1 | -1 {
  const top = column * WIDTH;
  let best = top;
  let largest = Math.abs(work[top + column] as number);
  for (let row = top + WIDTH; row < SIZE; row += WIDTH) {
    const size = Math.abs(work[row + column] as number);
    if (size > largest) {
      largest = size;
      best = row;
    }
  }
  if (best === top) return 1;
  for (let k = column; k < WIDTH; k++) {
    const kept = work[top + k] as number;
    work[top + k] = work[best + k] as number;
    work[best + k] = kept;
  }
  return -1;
}

function singular(report: Float64Array): false {
  report[0] = 0;
  return false;
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
