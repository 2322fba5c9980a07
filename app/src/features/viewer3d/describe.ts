// The picture in words: its caption, its text alternative, and what cannot be drawn.

import type { LengthUnit } from "@linkwright/contract";
import { type Axle, degFromRad, type Fault, SIDES, type Side } from "@linkwright/kinematics";
import { formatTravel, unitSymbol } from "../../lib/format.ts";
import type { ViewName } from "./viewPlaces.ts";
import type { Viewpoint } from "./viewpoint.ts";

/** By azimuth, which grows from the front towards the left. */
const SECTORS = [
  "the front",
  "the front left",
  "the left side",
  "the rear left",
  "the rear",
  "the rear right",
  "the right side",
  "the front right",
] as const;

const STEEP_DEG = 75;
const LEVEL_DEG = 8;

const FROM: Readonly<Record<Exclude<ViewName, "alongTieRod">, string>> = {
  front: "From the front",
  side: "From the left side",
  top: "From above",
  threeQuarter: "From the front left, above",
};

/** What a view is called over the picture; `rod` as "left tie rod". */
export function viewInWords(view: ViewName, rod: string): string {
  return view === "alongTieRod" ? `Along the ${rod}` : FROM[view];
}

/** "From the front left, above": what is seen after the picture was turned by hand. */
export function whereFrom({ azimuthRad, elevationRad }: Viewpoint): string {
  const elevationDeg = degFromRad(elevationRad);
  if (Math.abs(elevationDeg) > STEEP_DEG) return elevationDeg > 0 ? "From above" : "From below";
  const eighth = Math.round(degFromRad(azimuthRad) / 45);
  const sector = SECTORS[((eighth % 8) + 8) % 8];
  if (Math.abs(elevationDeg) < LEVEL_DEG) return `From ${sector}`;
  return `From ${sector}, ${elevationDeg > 0 ? "above" : "below"}`;
}

/** "ghosts at ±52 mm", or null when there are none. */
export function ghostsInWords(ghosts: readonly number[], unit: LengthUnit): string | null {
  const [one, other] = ghosts;
  if (one === undefined) return null;
  const symbol = unitSymbol(unit);
  if (other !== undefined && ghosts.length === 2 && one === -other) {
    return `ghosts at ±${formatTravel(Math.abs(one), unit).replace(/^\+/, "")} ${symbol}`;
  }
  return `ghosts at ${ghosts.map((ghost) => formatTravel(ghost, unit)).join(", ")} ${symbol}`;
}

export interface Situation {
  readonly axle: Axle;
  readonly travel: Readonly<Record<Side, number>>;
  readonly unit: LengthUnit;
  /** "straight ahead"; null where nothing steers. */
  readonly steering: string | null;
}

/** "wheels at +30 mm of travel, left lock". */
export function situationInWords({ travel, unit, steering }: Situation): string {
  const symbol = unitSymbol(unit);
  const [left, right] = SIDES.map((side) => `${formatTravel(travel[side], unit)} ${symbol}`);
  const wheels =
    travel.left === travel.right
      ? `wheels at ${left} of travel`
      : `left wheel at ${left} and right wheel at ${right} of travel`;
  return steering === null ? wheels : `${wheels}, ${steering}`;
}

export function altText(situation: Situation, caption: string, missing: readonly Side[]): string {
  const axle = situation.axle.position === "front" ? "Front axle" : "Rear axle";
  const from = caption.charAt(0).toLowerCase() + caption.slice(1);
  const unreached = missing.map((side) => ` The ${side} side cannot be reached there and is not drawn.`);
  return `${axle} ${from}: ${situationInWords(situation)}.${unreached.join("")}`;
}

/** Null while both sides can be drawn. */
export function missingInWords(situation: Situation, missing: readonly Side[]): string | null {
  const [side] = missing;
  if (side === undefined) return null;
  const where = situationInWords(situation);
  return missing.length > 1
    ? `Neither side can be reached with ${where}.`
    : `The ${side} side cannot be reached with ${where}; the ${side === "left" ? "right" : "left"} is drawn.`;
}

/** The worst of what bars release, in a few words; null when nothing does. */
export function redFaultInWords(faults: readonly Fault[], tieRod: string): string | null {
  const reds = faults.filter(({ severity }) => severity === "red");
  const worst = reds.find(({ kind }) => kind === "steersBackwards") ?? reds[0];
  if (worst === undefined) return null;
  switch (worst.kind) {
    case "steersBackwards":
      return "Steers backwards";
    case "nearToggle":
      return `Near its dead point: ${worst.side} ${tieRod} and steering arm`;
    case "outOfReach":
      return `Out of reach within its band: ${worst.side} side`;
    case "steeringNotStated":
      return null;
  }
}
