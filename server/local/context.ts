// What the bootstrap hands to the program it starts, and the error whose message alone is shown.

import type { HeldLock, LockHolder } from "./lock.mjs";

export type { HeldLock, LockHolder };

export type Context = {
  readonly root: string;
  /** `.data` in the checkout: everything that is kept. */
  readonly dataFolder: string;
  /** Raised by Ctrl-C, SIGTERM and SIGHUP. */
  readonly stop: AbortSignal;
  readonly args: readonly string[];
  say(line: string): void;
  step<T>(title: string, work: () => Promise<T>): Promise<T>;
  holdLock(name: string, explain: (holder: LockHolder) => string): HeldLock;
  readLock(name: string): LockHolder | null;
};

export class PlainProblem extends Error {
  override name = "PlainProblem";
}

/** Lines of text in columns, as the summary after a start shows them. */
export function columns(rows: readonly (readonly string[])[]): string {
  const widths = rows[0]?.map((_, column) => Math.max(...rows.map((row) => row[column]?.length ?? 0))) ?? [];
  return rows
    .map((row) => `  ${row.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join("  ")}`.trimEnd())
    .join("\n");
}
