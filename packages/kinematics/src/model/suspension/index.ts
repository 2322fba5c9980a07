// Every kind of suspension the documents know: a new one is one file beside this and one line here.

import type { Suspension } from "../axle.ts";
import { doubleWishbone } from "./doubleWishbone.ts";
import type { SuspensionKind } from "./kind.ts";

type Kinds = { readonly [T in Suspension["type"]]: SuspensionKind<Extract<Suspension, { type: T }>> };

const KINDS: Kinds = { doubleWishbone };

export function suspensionKind<S extends Suspension>(suspension: S): SuspensionKind<S> {
  // Indexed by the suspension's own type, the entry is the kind of exactly that member of the union.
  return KINDS[suspension.type] as unknown as SuspensionKind<S>;
}

export type { HardpointName, HingedArm, SuspensionParts } from "./kind.ts";
