// The roll centre, from the contact points and their velocities in the front view.

import type { Direction, Point } from "../geometry/vec3.ts";
import { degFromRad } from "../units.ts";
import { type Measured, measured, unmeasured } from "./measured.ts";

/** Lines nearer to parallel than this cross so far out that the crossing says nothing. */
const PARALLEL_WITHIN_DEG = 0.05;

export interface ContactMotion {
  readonly p_V_contact: Point<"V">;
  /** Velocity of the contact point as a point of the knuckle, per mm of bump. */
  readonly v_V_contact: Direction<"V">;
}

export interface RollCentre {
  /** Above the line through both contact points, along Z at the crossing's y; at y = 0 when parallel. */
  readonly height: Measured;
  /** + left. */
  readonly lateral: Measured;
}

/**
 * Where the two lines meet that pass through each contact point at right angles to its velocity in the front
 * view (SAE J670 and ISO 8855 define the same point by force; for a rigid linkage they agree).
 */
export function measureRollCentre(left: ContactMotion, right: ContactMotion): RollCentre {
  const ground = lineThrough(left.p_V_contact, right.p_V_contact);
  const a = normalLine(left);
  const b = normalLine(right);
  if (ground === null || a === null || b === null) {
    const because = "the line at right angles to a contact point's velocity stands upright";
    return { height: unmeasured(because), lateral: unmeasured(because) };
  }
  const apartDeg = Math.abs(degFromRad(Math.atan(a.slope) - Math.atan(b.slope)));
  if (apartDeg < PARALLEL_WITHIN_DEG) {
    return {
      height: measured((heightAt(a, 0) + heightAt(b, 0)) / 2 - heightAt(ground, 0)),
      lateral: unmeasured("the two lines are parallel within 0.05°"),
    };
  }
  const y = (heightAt(b, 0) - heightAt(a, 0)) / (a.slope - b.slope);
  return { height: measured(heightAt(a, y) - heightAt(ground, y)), lateral: measured(y) };
}

/** z = z₀ + slope·(y − y₀) in the front view. */
interface Line {
  readonly y0: number;
  readonly z0: number;
  readonly slope: number;
}

function heightAt(line: Line, y: number): number {
  return line.z0 + line.slope * (y - line.y0);
}

function lineThrough(p: Point<"V">, q: Point<"V">): Line | null {
  if (p[1] === q[1]) return null;
  return { y0: p[1], z0: p[2], slope: (q[2] - p[2]) / (q[1] - p[1]) };
}

/** At right angles to (v.y, v.z): direction (v.z, −v.y). */
function normalLine({ p_V_contact, v_V_contact }: ContactMotion): Line | null {
  if (v_V_contact[2] === 0) return null;
  return { y0: p_V_contact[1], z0: p_V_contact[2], slope: -v_V_contact[1] / v_V_contact[2] };
}
