// Everything that one corner tells at one pose.

import { type Pose, transformDirection, transformPoint } from "../geometry/pose.ts";
import { pointVelocity, type Twist } from "../geometry/twist.ts";
import type { Direction, Point } from "../geometry/vec3.ts";
import type { CornerDesign } from "../model/design.ts";
import { carryPoint } from "../pose/carriers.ts";
import { type Deg, degFromRad } from "../units.ts";
import { type Measured, measured, unmeasured } from "./measured.ts";
import { measureSpring } from "./spring.ts";
import {
  measureCasterDeg,
  measureGroundOffsets,
  measureKingpinInclinationDeg,
  type SteeringAxis,
} from "./steeringAxis.ts";
import { measureToggleMarginDeg } from "./toggle.ts";
import { camberRateRad, contactPoint, measureCamberDeg, measureToeDeg, toeRateRad } from "./wheel.ts";

/** A corner's pose, the motion that wheel travel gives it there, and where its inner joint stands. */
export interface CornerState {
  readonly pose: Pose<"V", "K">;
  /** Per mm of bump; null where the linkage is at its limit and has none. */
  readonly bumpTwist: Twist | null;
  readonly p_V_inner: Point<"V">;
}

export interface CornerMeasures {
  readonly toeDeg: Deg;
  readonly camberDeg: Deg;
  readonly p_V_wheelCentre: Point<"V">;
  readonly p_V_contact: Point<"V">;
  readonly steeringAxis: SteeringAxis | null;
  readonly casterDeg: Measured;
  readonly kingpinInclinationDeg: Measured;
  readonly casterTrail: Measured;
  readonly scrubRadius: Measured;
  readonly toggleMarginDeg: Measured;
  readonly bumpSteerDegPerMm: Measured;
  readonly camberChangeDegPerMm: Measured;
  /** Null without a spring. */
  readonly spring: { readonly length: Measured; readonly motionRatio: Measured } | null;
  /** Per mm of bump, as points of the knuckle; null with bumpTwist. */
  readonly v_V_contact: Direction<"V"> | null;
  readonly v_V_wheelCentre: Direction<"V"> | null;
}

const AT_LIMIT = "the linkage is at the end of its travel here, where no rate exists";
const NO_AXIS = "this suspension has no fixed steering axis";
const AXIS_LEVEL = "the steering axis lies level and never meets the ground";
const STILL: Twist = { velocity: [0, 0, 0], angular: [0, 0, 0] };

export function measureCorner(design: CornerDesign, state: CornerState): CornerMeasures {
  const { pose, bumpTwist } = state;
  const { outward } = design;
  const u_V_spin = transformDirection(pose, design.u_K_spin);
  const p_V_wheelCentre = transformPoint(pose, design.p_K_wheelCentre);
  const p_V_contact = contactPoint(p_V_wheelCentre, u_V_spin, design.wheel.loadedRadius);
  return {
    toeDeg: measureToeDeg(u_V_spin, outward),
    camberDeg: measureCamberDeg(u_V_spin),
    p_V_wheelCentre,
    p_V_contact,
    ...steeringMeasures(design, state, p_V_contact, u_V_spin),
    bumpSteerDegPerMm: rate(bumpTwist, (twist) => degFromRad(toeRateRad(u_V_spin, outward, twist))),
    camberChangeDegPerMm: rate(bumpTwist, (twist) => degFromRad(camberRateRad(u_V_spin, twist))),
    spring: springMeasures(design, state),
    v_V_contact: bumpTwist && pointVelocity(bumpTwist, p_V_contact),
    v_V_wheelCentre: bumpTwist && pointVelocity(bumpTwist, p_V_wheelCentre),
  };
}

function rate(twist: Twist | null, measure: (twist: Twist) => number): Measured {
  return twist === null ? unmeasured(AT_LIMIT) : measured(measure(twist));
}

type SteeringMeasures = Pick<
  CornerMeasures,
  "steeringAxis" | "casterDeg" | "kingpinInclinationDeg" | "casterTrail" | "scrubRadius" | "toggleMarginDeg"
>;

function steeringMeasures(
  design: CornerDesign,
  { pose, p_V_inner }: CornerState,
  p_V_contact: Point<"V">,
  u_V_spin: Direction<"V">,
): SteeringMeasures {
  const points = design.parts.steeringAxis;
  if (points === null) {
    const none = unmeasured(NO_AXIS);
    return {
      steeringAxis: null,
      casterDeg: none,
      kingpinInclinationDeg: none,
      casterTrail: none,
      scrubRadius: none,
      toggleMarginDeg: none,
    };
  }
  const axis = { lower: transformPoint(pose, points.lower), upper: transformPoint(pose, points.upper) };
  const ground = measureGroundOffsets(axis, p_V_contact, u_V_spin, design.outward);
  const p_V_outer = transformPoint(pose, design.tieRod.outer);
  const margin = measureToggleMarginDeg(axis, p_V_outer, p_V_inner);
  return {
    steeringAxis: axis,
    casterDeg: measured(measureCasterDeg(axis)),
    kingpinInclinationDeg: measured(measureKingpinInclinationDeg(axis, design.outward)),
    casterTrail: ground === null ? unmeasured(AXIS_LEVEL) : measured(ground.casterTrail),
    scrubRadius: ground === null ? unmeasured(AXIS_LEVEL) : measured(ground.scrubRadius),
    toggleMarginDeg:
      margin === null
        ? unmeasured("steering arm or tie rod has no length seen along the steering axis")
        : measured(margin),
  };
}

function springMeasures(design: CornerDesign, state: CornerState): CornerMeasures["spring"] {
  const { spring } = design;
  if (spring === null) return null;
  const carried = carryPoint(design, spring.on, spring.lower, state.pose, state.bumpTwist ?? STILL);
  const found = carried && measureSpring(spring.body, carried.point, carried.velocity);
  if (found === null) {
    const none = unmeasured("the spring has no length or no arm to stand on here");
    return { length: none, motionRatio: none };
  }
  return {
    length: measured(found.length),
    motionRatio: state.bumpTwist === null ? unmeasured(AT_LIMIT) : measured(found.motionRatio),
  };
}
