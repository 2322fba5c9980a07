// Faults of the engine → what a person reads: what is wrong, where, and what to do about it.

import type { LengthUnit } from "@linkwright/contract";
import { type Axle, type Fault, poseAxle, type RideHeight, type Side } from "@linkwright/kinematics";
import { capitalise, type DialectWord } from "../../lib/dialect.ts";
import { formatAngle, formatLength } from "../../lib/format.ts";
import { linkInWords } from "./linkWords.ts";
import { steerInWords } from "./steerWords.ts";

export type NamedBand = Pick<RideHeight, "name" | "wheelUp" | "band">;

export interface FaultPlace {
  readonly height: string;
  /** About that ride height. */
  readonly travel: number;
  readonly steer: number;
}

export interface FaultReport {
  readonly key: string;
  readonly severity: Fault["severity"];
  readonly title: string;
  /** Null where it is so everywhere. */
  readonly where: string | null;
  readonly meaning: string;
  readonly advice: string;
  readonly place: FaultPlace | null;
}

export interface ReportContext {
  readonly axle: Axle;
  readonly heights: readonly NamedBand[];
  readonly units: LengthUnit;
  readonly words: Readonly<Record<DialectWord, string>>;
}

type NearToggle = Extract<Fault, { kind: "nearToggle" }>;
type OutOfReach = Extract<Fault, { kind: "outOfReach" }>;

/** Red first; what repeats at other steering positions of the same wheel is told once, where it is worst. */
export function reportFaults(faults: readonly Fault[], context: ReportContext): FaultReport[] {
  const reports = new Map<string, FaultReport>();
  for (const fault of worstFirst(faults)) {
    const report = reportFault(fault, context);
    if (!reports.has(report.key)) reports.set(report.key, report);
  }
  return [...reports.values()];
}

function worstFirst(faults: readonly Fault[]): Fault[] {
  const rank = (fault: Fault) => (fault.severity === "red" ? 0 : 1);
  return [...faults].sort((a, b) => rank(a) - rank(b) || reachOf(a) - reachOf(b));
}

/** How far a wheel gets before it stops: the less, the worse. Other faults keep their order. */
function reachOf(fault: Fault): number {
  if (fault.kind !== "outOfReach") return 0;
  return fault.lastTravel === null ? -1 : Math.abs(fault.lastTravel - fault.wheelUp);
}

function reportFault(fault: Fault, context: ReportContext): FaultReport {
  switch (fault.kind) {
    case "steersBackwards":
      return {
        key: fault.kind,
        severity: fault.severity,
        title: "It steers backwards",
        where: null,
        meaning: "As drawn, turning the steering wheel left turns the car right. Do not drive it like this.",
        advice:
          "A rack made for steering arms behind the axle does this when it is put ahead of it unaltered, and the other way round. Put the rack on the other side of the axle, or use one that moves the other way. If only the drawing is wrong, mend “Turning left moves the rack” under Points, Steering.",
        place: null,
      };
    case "steeringNotStated":
      return {
        key: fault.kind,
        severity: fault.severity,
        title: "Which way it steers is not stated",
        where: null,
        meaning: "Nobody can check yet that turning left steers the car left.",
        advice: "State under Points, Steering, which way the rack moves when the driver turns left.",
        place: null,
      };
    case "nearToggle":
      return reportToggle(fault, context);
    case "outOfReach":
      return reportReach(fault, context);
  }
}

function reportToggle(fault: NearToggle, context: ReportContext): FaultReport {
  const { severity, side, marginDeg } = fault;
  const rod = `${context.words.tieRod}`;
  const margin = formatAngle(marginDeg, { decimals: 1 });
  const place = placeOf(fault, fault.travel, context);
  return {
    key: `${fault.kind} ${fault.wheelUp}`,
    severity,
    title: `${capitalise(side)} steering arm and ${rod} only ${margin} from lying in line`,
    where: placeInWords(place, context),
    meaning:
      severity === "red"
        ? "Under 20° the steering may go over its dead point and not come back."
        : "Under 30° it nears its dead point: the steering grows heavy and uneven there.",
    advice: `Shorten the rack's travel, lengthen the steering arm, or move the ${rod}'s joints, until at least 30° are left.`,
    place,
  };
}

function reportReach(fault: OutOfReach, context: ReportContext): FaultReport {
  const { side, steer, lastTravel, wheelUp, link, severity } = fault;
  const place = placeOf(fault, lastTravel ?? wheelUp, context);
  const way = wayLost(fault, context.axle);
  const runsOut = `What runs out is the ${linkInWords(link, context.words)}`;
  const common = { key: `${fault.kind} ${wheelUp} ${side} ${way}`, severity };
  if (way === "height") {
    return {
      ...common,
      title: `${capitalise(side)} wheel cannot be brought to the ride height ${place.height}`,
      where: null,
      meaning: `${runsOut} on the way there.`,
      advice:
        "Choose a ride height nearer to the drawn one, or move the points so that the linkage reaches it.",
      place: null,
    };
  }
  if (way === "lock") {
    const lock = steerInWords(context.axle, steer, context.units);
    return {
      ...common,
      title: `${capitalise(side)} wheel cannot be steered to ${lock}`,
      where: place.height,
      meaning: `${runsOut} before the steering comes to its end: it would lock solid or go over its dead point.`,
      advice: "Shorten the rack's travel, or move the points so that the linkage reaches further.",
      place: null,
    };
  }
  const reach = formatLength(place.travel, context.units, { sign: "always" });
  return {
    ...common,
    title: `${capitalise(side)} wheel comes to its end at ${reach} in ${way}`,
    where: placeInWords(place, context),
    meaning: `${runsOut} inside the travel that was asked for: the linkage locks solid there.`,
    advice:
      "Shorten the ride height's band or the rack's travel, or move the points so that it reaches further.",
    place,
  };
}

/** A ride height that is not reached ends on its way there, which alone looks like an end in droop or bump. */
function wayLost(
  { side, lastTravel, wheelUp }: OutOfReach,
  axle: Axle,
): "height" | "lock" | "bump" | "droop" {
  if (lastTravel === null) return "lock";
  const travel = { left: wheelUp, right: wheelUp };
  if (poseAxle(axle, { travel, steer: 0, wheelUp })[side] === null) return "height";
  return lastTravel >= wheelUp ? "bump" : "droop";
}

function placeOf(
  fault: { readonly wheelUp: number; readonly steer: number; readonly side: Side },
  travel: number,
  { heights }: ReportContext,
): FaultPlace {
  const height = heights.find(({ wheelUp }) => wheelUp === fault.wheelUp)?.name ?? "Design height";
  return { height, travel: travel - fault.wheelUp, steer: fault.steer };
}

function placeInWords({ height, travel, steer }: FaultPlace, { axle, units }: ReportContext): string {
  const wheel =
    Math.abs(travel) < 0.05
      ? "at ride height"
      : `wheel at ${formatLength(travel, units, { sign: "always" })}`;
  return `${height}, ${wheel}, ${steerInWords(axle, steer, units)}`;
}
