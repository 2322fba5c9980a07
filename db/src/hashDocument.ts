// The hash that stands for a document: the same content gives the same hash, however its keys are ordered.

import { createHash } from "node:crypto";
import canonicalize from "canonicalize";

/** SHA-256 in hex over the canonical JSON of RFC 8785. */
export function hashDocument(document: unknown): string {
  const canonical = canonicalize(document);
  if (canonical === undefined) throw new Error("only a JSON document has a hash");
  return createHash("sha256").update(canonical).digest("hex");
}

/** Whether two JSON values are the same, whatever the order of their keys; undefined equals only itself. */
export function isSameDocument(a: unknown, b: unknown): boolean {
  return canonicalize(a) === canonicalize(b);
}
