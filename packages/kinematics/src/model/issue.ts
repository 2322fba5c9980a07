// How every refusal of a document is told: what, where, and what to do about it.

export type Path = readonly (string | number)[];

export interface Issue {
  /** From the document's root. */
  readonly path: Path;
  /** What stood there. */
  readonly value: unknown;
  /** What is wrong, a sentence. */
  readonly problem: string;
  /** What to do about it, a sentence. */
  readonly hint: string;
}

/** `left.tieRod.inner`, or `rideHeights[0].band`: the way a path is written for people. */
export function formatPath(path: Path): string {
  let text = "";
  for (const step of path) {
    if (typeof step === "number") text += `[${step}]`;
    else text += text === "" ? step : `.${step}`;
  }
  return text === "" ? "document" : text;
}
