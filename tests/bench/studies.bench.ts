// What the screens ask of the engine, in milliseconds of CPU.

import { type Axle, findFaults, flatten, poseAxle, sweepAxle } from "@linkwright/kinematics";
import { timeCalls } from "./measure.ts";

const TRAVELS = Array.from({ length: 33 }, (_, k) => (k - 16) * 5);
const HEIGHTS = [
  { wheelUp: 0, band: [-60, 60] as const },
  { wheelUp: 40, band: [-60, 40] as const },
];

export function benchStudies(axle: Axle): string[] {
  const row = (what: string, work: () => void) =>
    `${what.padEnd(48)}${(timeCalls(work, { rounds: 5 }).secondsPerCall * 1e3).toFixed(2)} ms`;
  return [
    row("sweep, 33 travels, both sides, every quantity", () =>
      sweepAxle(axle, { travels: TRAVELS, steers: [0] }),
    ),
    row("every hardpoint at one travel and steer", () =>
      poseAxle(axle, { travel: { left: 30, right: -30 }, steer: 10 }),
    ),
    row("safety faults over two ride heights × lock", () => findFaults(axle, HEIGHTS)),
    row("flatten, 3 moves, 2 ride heights, 7 starts", () =>
      flatten(axle, {
        free: [
          { move: "rackHeight", low: -30, high: 30 },
          { move: "rackForeAft", low: -20, high: 20 },
          { move: "innerWidth", low: -30, high: 30 },
        ],
        heights: HEIGHTS,
        step: 5,
      }),
    ),
  ];
}
