// Gauss elimination of a 6 × 7 system, apart from the Newton loop that it serves.

import { EQUATIONS } from "./constraints.ts";

const WIDTH = EQUATIONS + 1;
const SIZE = EQUATIONS * WIDTH;

/**
 * mm or 1. Above it the given order of equations costs at most three of sixteen digits; below, rows are exchanged.
 * Entries are 1 (directions) and 100 … 1000 (moments).
 */
const SAFE_PIVOT = 1e-3;

/** mm or 1. A pivot this small is round-off: the system is singular. */
const SMALLEST_PIVOT = 1e-13;

/**
 * Solves the 6 × 7 system in `work`, row after row, into `solution`, and writes the determinant to report[0]
 * (0 when singular). False when singular: `solution` is then not written. `work` is used up.
 *
 * Written out in scalars, which stay in registers: four times as fast as loops over the array. The equations are
 * taken in the order they stand in, which assembleSystem has chosen; where that order meets a small pivot, rows
 * are exchanged instead.
 */
export function eliminate(work: Float64Array, solution: Float64Array, report: Float64Array): boolean {
  const a00 = work[0] as number;
  const a01 = work[1] as number;
  const a02 = work[2] as number;
  const a03 = work[3] as number;
  const a04 = work[4] as number;
  const a05 = work[5] as number;
  const a06 = work[6] as number;
  const a10 = work[7] as number;
  let a11 = work[8] as number;
  let a12 = work[9] as number;
  let a13 = work[10] as number;
  let a14 = work[11] as number;
  let a15 = work[12] as number;
  let a16 = work[13] as number;
  const a20 = work[14] as number;
  let a21 = work[15] as number;
  let a22 = work[16] as number;
  let a23 = work[17] as number;
  let a24 = work[18] as number;
  let a25 = work[19] as number;
  let a26 = work[20] as number;
  const a30 = work[21] as number;
  let a31 = work[22] as number;
  let a32 = work[23] as number;
  let a33 = work[24] as number;
  let a34 = work[25] as number;
  let a35 = work[26] as number;
  let a36 = work[27] as number;
  const a40 = work[28] as number;
  let a41 = work[29] as number;
  let a42 = work[30] as number;
  let a43 = work[31] as number;
  let a44 = work[32] as number;
  let a45 = work[33] as number;
  let a46 = work[34] as number;
  const a50 = work[35] as number;
  let a51 = work[36] as number;
  let a52 = work[37] as number;
  let a53 = work[38] as number;
  let a54 = work[39] as number;
  let a55 = work[40] as number;
  let a56 = work[41] as number;
  if (!(Math.abs(a00) > SAFE_PIVOT)) return eliminatePivoting(work, solution, report);
  const i0 = 1 / a00;
  const f10 = a10 * i0;
  a11 -= f10 * a01;
  a12 -= f10 * a02;
  a13 -= f10 * a03;
  a14 -= f10 * a04;
  a15 -= f10 * a05;
  a16 -= f10 * a06;
  const f20 = a20 * i0;
  a21 -= f20 * a01;
  a22 -= f20 * a02;
  a23 -= f20 * a03;
  a24 -= f20 * a04;
  a25 -= f20 * a05;
  a26 -= f20 * a06;
  const f30 = a30 * i0;
  a31 -= f30 * a01;
  a32 -= f30 * a02;
  a33 -= f30 * a03;
  a34 -= f30 * a04;
  a35 -= f30 * a05;
  a36 -= f30 * a06;
  const f40 = a40 * i0;
  a41 -= f40 * a01;
  a42 -= f40 * a02;
  a43 -= f40 * a03;
  a44 -= f40 * a04;
  a45 -= f40 * a05;
  a46 -= f40 * a06;
  const f50 = a50 * i0;
  a51 -= f50 * a01;
  a52 -= f50 * a02;
  a53 -= f50 * a03;
  a54 -= f50 * a04;
  a55 -= f50 * a05;
  a56 -= f50 * a06;
  if (!(Math.abs(a11) > SAFE_PIVOT)) return eliminatePivoting(work, solution, report);
  const i1 = 1 / a11;
  const f21 = a21 * i1;
  a22 -= f21 * a12;
  a23 -= f21 * a13;
  a24 -= f21 * a14;
  a25 -= f21 * a15;
  a26 -= f21 * a16;
  const f31 = a31 * i1;
  a32 -= f31 * a12;
  a33 -= f31 * a13;
  a34 -= f31 * a14;
  a35 -= f31 * a15;
  a36 -= f31 * a16;
  const f41 = a41 * i1;
  a42 -= f41 * a12;
  a43 -= f41 * a13;
  a44 -= f41 * a14;
  a45 -= f41 * a15;
  a46 -= f41 * a16;
  const f51 = a51 * i1;
  a52 -= f51 * a12;
  a53 -= f51 * a13;
  a54 -= f51 * a14;
  a55 -= f51 * a15;
  a56 -= f51 * a16;
  if (!(Math.abs(a22) > SAFE_PIVOT)) return eliminatePivoting(work, solution, report);
  const i2 = 1 / a22;
  const f32 = a32 * i2;
  a33 -= f32 * a23;
  a34 -= f32 * a24;
  a35 -= f32 * a25;
  a36 -= f32 * a26;
  const f42 = a42 * i2;
  a43 -= f42 * a23;
  a44 -= f42 * a24;
  a45 -= f42 * a25;
  a46 -= f42 * a26;
  const f52 = a52 * i2;
  a53 -= f52 * a23;
  a54 -= f52 * a24;
  a55 -= f52 * a25;
  a56 -= f52 * a26;
  if (!(Math.abs(a33) > SAFE_PIVOT)) return eliminatePivoting(work, solution, report);
  const i3 = 1 / a33;
  const f43 = a43 * i3;
  a44 -= f43 * a34;
  a45 -= f43 * a35;
  a46 -= f43 * a36;
  const f53 = a53 * i3;
  a54 -= f53 * a34;
  a55 -= f53 * a35;
  a56 -= f53 * a36;
  if (!(Math.abs(a44) > SAFE_PIVOT)) return eliminatePivoting(work, solution, report);
  const i4 = 1 / a44;
  const f54 = a54 * i4;
  a55 -= f54 * a45;
  a56 -= f54 * a46;
  if (!(Math.abs(a55) > SAFE_PIVOT)) return eliminatePivoting(work, solution, report);
  const x5 = a56 / a55;
  const x4 = (a46 - a45 * x5) * i4;
  const x3 = (a36 - a34 * x4 - a35 * x5) * i3;
  const x2 = (a26 - a23 * x3 - a24 * x4 - a25 * x5) * i2;
  const x1 = (a16 - a12 * x2 - a13 * x3 - a14 * x4 - a15 * x5) * i1;
  const x0 = (a06 - a01 * x1 - a02 * x2 - a03 * x3 - a04 * x4 - a05 * x5) * i0;
  solution[0] = x0;
  solution[1] = x1;
  solution[2] = x2;
  solution[3] = x3;
  solution[4] = x4;
  solution[5] = x5;
  report[0] = a00 * a11 * a22 * a33 * a44 * a55;
  return true;
}

/** The same with row pivoting, for the positions where the usual order will not do. */
function eliminatePivoting(work: Float64Array, solution: Float64Array, report: Float64Array): boolean {
  let determinant = 1;
  for (let column = 0; column < EQUATIONS; column++) {
    const top = column * WIDTH;
    determinant *= bringUpPivot(work, column);
    const pivot = work[top + column] as number;
    if (!(Math.abs(pivot) > SMALLEST_PIVOT)) {
      report[0] = 0;
      return false;
    }
    determinant *= pivot;
    for (let row = top + WIDTH; row < SIZE; row += WIDTH) {
      const factor = (work[row + column] as number) / pivot;
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
