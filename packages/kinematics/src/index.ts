// The public surface of the engine.

export type { Quaternion } from "./geometry/rotation.ts";
export { rotate, rotationAbout } from "./geometry/rotation.ts";
export type { ConstraintRow, DistanceRow, Drive, PointOnLineRow } from "./geometry/rows.ts";
export type * from "./model/axle.ts";
export { AXLE_FORMAT } from "./model/axle.ts";
export { pointInDatum } from "./model/datum.ts";
export { SIDES, type Side } from "./model/design.ts";
export { type Hardpoint, listHardpoints, moveHardpoint } from "./model/hardpoints.ts";
export { formatPath, type Issue, type Path } from "./model/issue.ts";
export { mirrorCorner, mirrorPoint, rightCorner } from "./model/mirror.ts";
export { steeringLock, steeringUnit } from "./model/steering/index.ts";
export type * from "./model/study.ts";
export { STUDY_FORMAT, TARGET_QUANTITIES } from "./model/study.ts";
export { checkAxle, checkStudy } from "./pose/checkAxle.ts";
export {
  type CornerSolver,
  type CornerSolverOutcome,
  poseAt,
  prepareCorner,
  steerTo,
  type TravelColumn,
  travelColumn,
} from "./pose/cornerSolver.ts";
export { type AxleInputs, type CornerPlacement, poseAxle } from "./pose/poseAxle.ts";
export {
  type Band,
  type BumpSteerCurve,
  type BumpSteerFigures,
  bandTravels,
  bumpSteerCurve,
  bumpSteerCurves,
  summariseCurve,
  worseOf,
} from "./studies/bumpSteer.ts";
export {
  applyMoves,
  type FlattenOutcome,
  type FlattenRequest,
  type FreeMove,
  flatten,
  type HeightResult,
} from "./studies/flatten/flatten.ts";
export { applyMove, MOVES, type Move, whyNotMove } from "./studies/flatten/moves.ts";
export { type Fault, findFaults } from "./studies/safety/faults.ts";
export { steerPerInput } from "./studies/safety/steeringDirection.ts";
export type { AxleRow } from "./sweeps/axleRow.ts";
export type { SideRow } from "./sweeps/sideRow.ts";
export {
  type Sweep,
  type SweepEnd,
  type SweepRequest,
  type SweepRow,
  sweepAxle,
} from "./sweeps/sweepAxle.ts";
export { type Deg, degFromRad, type Rad, radFromDeg } from "./units.ts";
