// Every kind of steering the documents know: a new one is one file beside this and one line here.

import type { Steering } from "../axle.ts";
import { fixed } from "./fixed.ts";
import type { SteeringKind } from "./kind.ts";
import { rack } from "./rack.ts";

type Kinds = { readonly [T in Steering["type"]]: SteeringKind<Extract<Steering, { type: T }>> };

const KINDS: Kinds = { rack, fixed };

export function steeringKind<S extends Steering>(steering: S): SteeringKind<S> {
  // Indexed by the steering's own type, the entry is the kind of exactly that member of the union.
  return KINDS[steering.type] as unknown as SteeringKind<S>;
}

/** Full lock either way, mm or degrees as the steering's type has it; 0 for a fixed toe link. */
export function steeringLock(steering: Steering): number {
  return steeringKind(steering).lock(steering);
}

/** Unit of `steer` for this steering, null when nothing steers. */
export function steeringUnit(steering: Steering): "mm" | "°" | null {
  return steeringKind(steering).unit;
}
