// The second method's door: an axle solved with circles, spheres and bracketed roots, for the tests to hold the engine to.

export { type AxleColumns, type ClosedFormRow, partsOf, sweepByClosedForm } from "./axle.ts";
export { type Arm, type Knuckle, type Parts, type Pose, spinFromAngles } from "./corner.ts";
export { deviate } from "./deviations.ts";
export { anglesOf, contactPointOf, groundOffsets, kingpinGroundPoint, toeDegOf } from "./measure.ts";
export { type SideColumns, type SideSolution, solveSide } from "./side.ts";
export { poseAtTravel, setToeAt } from "./solve.ts";
