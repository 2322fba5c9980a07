import type { Id } from "@linkwright/contract";
import { v4 } from "uuid";

/** Made here, so that a request that is sent twice creates nothing twice. Works without a secure context, too. */
export function makeId(): Id {
  return v4();
}
