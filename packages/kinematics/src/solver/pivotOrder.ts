// The order in which equations are best eliminated: with it the hot loop seldom has to exchange rows.

import type { ConstraintRow, Drive } from "../geometry/rows.ts";
import { compileSystem, EQUATIONS, type PoseSystem, STRIDE } from "./constraints.ts";
import { evaluate } from "./newton.ts";

/** Rows and drives as a system whose equations stand in the order of their pivots at the design position. */
export function assembleSystem(rows: readonly ConstraintRow[], drives: readonly Drive[]): PoseSystem {
  const drawn = compileSystem(rows, drives);
  const order = pivotOrder(drawn);
  const table = new Float64Array(drawn.table.length);
  for (const [place, e] of order.entries()) {
    table.set(drawn.table.subarray(e * STRIDE, (e + 1) * STRIDE), place * STRIDE);
  }
  return {
    ...drawn,
    table,
    kinds: Uint8Array.from(order, (e) => drawn.kinds[e] as number),
    names: order.map((e) => drawn.names[e] as string),
  };
}

/** Which equation gives the pivot of each column, by elimination with row pivoting; any order when singular. */
function pivotOrder(system: PoseSystem): number[] {
  evaluate(system);
  const width = EQUATIONS + 1;
  const rows = Array.from({ length: EQUATIONS }, (_, e) => ({
    e,
    entries: [...system.work.subarray(e * width, e * width + EQUATIONS)],
  }));
  for (let column = 0; column < EQUATIONS; column++) {
    let best = column;
    for (let row = column + 1; row < EQUATIONS; row++) {
      if (sizeAt(rows[row], column) > sizeAt(rows[best], column)) best = row;
    }
    const pivot = rows[best] as (typeof rows)[number];
    rows[best] = rows[column] as (typeof rows)[number];
    rows[column] = pivot;
    for (const row of rows.slice(column + 1)) {
      const factor = (row.entries[column] as number) / (pivot.entries[column] as number);
      row.entries = row.entries.map((entry, k) => entry - factor * (pivot.entries[k] as number));
    }
  }
  return rows.map(({ e }) => e);
}

function sizeAt(row: { readonly entries: readonly number[] } | undefined, column: number): number {
  return Math.abs(row?.entries[column] ?? 0);
}
