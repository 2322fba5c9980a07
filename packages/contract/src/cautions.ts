// The cautions: shown at sign-up (acknowledged once, recorded), on the method page and on every sheet.

export interface Caution {
  readonly title: string;
  readonly text: string;
}

/** Goes up when the wording below changes in substance; what was acknowledged is recorded with it. */
export const CAUTIONS_EDITION = 1;

export const CAUTIONS: readonly Caution[] = [
  {
    title: "Geometry only",
    text: "The numbers say nothing of strength, fatigue, welds, brakes or handling at the limit. Bushes, frame and mounts flex: the driven curve is not quite this one.",
  },
  {
    title: "Parts that can kill",
    text: "Steering and suspension parts can kill when they fail or bind. Never heat, bend or weld bought steering parts. Welded knuckles and steering columns are unlawful in some places.",
  },
  {
    title: "Before driving: fixings",
    text: "Tapers match and seat. Thread engagement is at least the part's minimum. Lock nuts are tight and split pins new. Rod ends stand in double shear or have a safety washer.",
  },
  {
    title: "Before driving: movement",
    text: "With the springs out, over all travel and full lock, no joint comes within 3° of its stop and nothing touches. Droop is held by the damper or a strap, never by a joint or a hose. Steering returns from both locks and turns the way the wheel turns.",
  },
  {
    title: "Inspection",
    text: "Follow the local rules for modified vehicles, and have the work inspected by a licensed engineer or the authority where they ask for it.",
  },
];
