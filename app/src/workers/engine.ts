// What the engine does off the main thread. Plain functions, so that tests and a page without workers call them too.

import {
  type Axle,
  type Band,
  type Fault,
  type FlattenOutcome,
  type FlattenRequest,
  findFaults,
  flatten,
} from "@linkwright/kinematics";

export const engine = {
  flatten: (axle: Axle, request: FlattenRequest): FlattenOutcome => flatten(axle, request),
  findFaults: (axle: Axle, heights: readonly Band[]): Fault[] => findFaults(axle, heights),
};
export type Engine = typeof engine;
