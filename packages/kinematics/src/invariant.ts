// For bugs only: bad input has issues, an impossible position has an outcome.

/** Throws when the program itself is wrong. `message` should carry the values that show it. */
export function invariant(condition: boolean, message: string): asserts condition {
  if (!condition) throw new Error(`Invariant broken: ${message}`);
}

/** Closes a switch over a union: a new member without a case does not compile. */
export function assertNever(value: never): never {
  throw new Error(`Invariant broken: no case for ${JSON.stringify(value)}`);
}
