// What both sides of a row make together.

import { measureAckermannPercent } from "../metrics/ackermann.ts";
import { measureAntiGeometry } from "../metrics/antiGeometry.ts";
import type { CornerMeasures } from "../metrics/corner.ts";
import { type Measured, measured, unmeasured } from "../metrics/measured.ts";
import { measureRollCentre } from "../metrics/rollCentre.ts";
import { groundPoint } from "../metrics/steeringAxis.ts";
import type { Axle } from "../model/axle.ts";
import type { Side } from "../model/design.ts";
import { steeringUnit } from "../model/steering/index.ts";
import { numberOrTell, type TellBecause } from "./sideRow.ts";

export interface AxleRow {
  readonly rollCentreHeight: number | null;
  readonly rollCentreLateral: number | null;
  readonly ackermannPercent: number | null;
  readonly track: number | null;
  readonly antiDivePercent: number | null;
  readonly antiLiftPercent: number | null;
  readonly antiSquatPercent: number | null;
}

type AxleMeasures = { readonly [K in keyof AxleRow]: Measured };
type Sides = Readonly<Record<Side, CornerMeasures | null>>;

export function axleRow(axle: Axle, sides: Sides, straight: Sides, tell: TellBecause): AxleRow {
  const measures = measureAxle(axle, sides, straight);
  const value = (field: keyof AxleRow) => numberOrTell(measures[field], field, tell);
  return {
    rollCentreHeight: value("rollCentreHeight"),
    rollCentreLateral: value("rollCentreLateral"),
    ackermannPercent: value("ackermannPercent"),
    track: value("track"),
    antiDivePercent: value("antiDivePercent"),
    antiLiftPercent: value("antiLiftPercent"),
    antiSquatPercent: value("antiSquatPercent"),
  };
}

function measureAxle(axle: Axle, { left, right }: Sides, straight: Sides): AxleMeasures {
  if (left === null || right === null) return allUnmeasured("it needs both sides, and one cannot be reached");
  return {
    track: measured(left.p_V_contact[1] - right.p_V_contact[1]),
    ackermannPercent: ackermann(axle, { left, right }, straight),
    ...rates(axle, left, right),
  };
}

function rates(
  axle: Axle,
  left: CornerMeasures,
  right: CornerMeasures,
): Omit<AxleMeasures, "track" | "ackermannPercent"> {
  const [a, b] = [motion(left), motion(right)];
  if (a === null || b === null) {
    const none = unmeasured("one side is at the end of its travel here, where no rate exists");
    return {
      rollCentreHeight: none,
      rollCentreLateral: none,
      antiDivePercent: none,
      antiLiftPercent: none,
      antiSquatPercent: none,
    };
  }
  const { height, lateral } = measureRollCentre(a, b);
  return {
    rollCentreHeight: height,
    rollCentreLateral: lateral,
    ...measureAntiGeometry([a, b], axle),
  };
}

function motion({ p_V_contact, v_V_contact, v_V_wheelCentre }: CornerMeasures) {
  if (v_V_contact === null || v_V_wheelCentre === null) return null;
  return { p_V_contact, v_V_contact, v_V_wheelCentre };
}

function ackermann(
  axle: Axle,
  { left, right }: Readonly<Record<Side, CornerMeasures>>,
  straight: Sides,
): Measured {
  if (steeringUnit(axle.steering) === null) return unmeasured("nothing steers on this axle");
  if (straight.left === null || straight.right === null) {
    return unmeasured("this travel cannot be reached with the steering straight ahead");
  }
  const [a, b] = [straight.left, straight.right].map((side) =>
    side.steeringAxis === null ? null : groundPoint(side.steeringAxis, side.p_V_contact[2]),
  );
  if (!a || !b) return unmeasured("there is no steering axis that meets the ground");
  const leftSteerDeg = -(left.toeDeg - straight.left.toeDeg);
  const rightSteerDeg = right.toeDeg - straight.right.toeDeg;
  return measureAckermannPercent(leftSteerDeg, rightSteerDeg, a[1] - b[1], axle.wheelbase);
}

function allUnmeasured(because: string): AxleMeasures {
  const none = unmeasured(because);
  return {
    rollCentreHeight: none,
    rollCentreLateral: none,
    ackermannPercent: none,
    track: none,
    antiDivePercent: none,
    antiLiftPercent: none,
    antiSquatPercent: none,
  };
}
