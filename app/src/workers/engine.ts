// What the engine does off the main thread. A page that is given no worker calls the same functions itself.

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
  flatten: async (axle: Axle, request: FlattenRequest): Promise<FlattenOutcome> => flatten(axle, request),
  findFaults: async (axle: Axle, heights: readonly Band[]): Promise<Fault[]> => findFaults(axle, heights),
};
export type Engine = typeof engine;
