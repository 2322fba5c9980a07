// One side of a row, as it goes out: numbers, points, or null with a reason.

import type { CornerMeasures } from "../metrics/corner.ts";
import type { Measured } from "../metrics/measured.ts";
import type { Coordinates } from "../model/axle.ts";

export interface SideRow {
  readonly toeDeg: number;
  readonly camberDeg: number;
  readonly casterDeg: number | null;
  readonly kingpinInclinationDeg: number | null;
  readonly casterTrail: number | null;
  readonly scrubRadius: number | null;
  readonly wheelCentre: Coordinates;
  readonly contactPoint: Coordinates;
  readonly bumpSteerDegPerMm: number | null;
  readonly camberChangeDegPerMm: number | null;
  readonly toggleMarginDeg: number | null;
  /** Only with a spring. */
  readonly springLength?: number | null;
  readonly springMotionRatio?: number | null;
}

export type TellBecause = (field: string, reason: string) => void;

/** The number, or null after its reason was told. */
export function numberOrTell(measure: Measured, field: string, tell: TellBecause): number | null {
  if (measure.value === null) tell(field, measure.because);
  return measure.value;
}

export function sideRow(measures: CornerMeasures, tell: TellBecause): SideRow {
  const value = (field: string, measure: Measured) => numberOrTell(measure, field, tell);
  const { spring } = measures;
  return {
    toeDeg: measures.toeDeg,
    camberDeg: measures.camberDeg,
    casterDeg: value("casterDeg", measures.casterDeg),
    kingpinInclinationDeg: value("kingpinInclinationDeg", measures.kingpinInclinationDeg),
    casterTrail: value("casterTrail", measures.casterTrail),
    scrubRadius: value("scrubRadius", measures.scrubRadius),
    wheelCentre: measures.p_V_wheelCentre,
    contactPoint: measures.p_V_contact,
    bumpSteerDegPerMm: value("bumpSteerDegPerMm", measures.bumpSteerDegPerMm),
    camberChangeDegPerMm: value("camberChangeDegPerMm", measures.camberChangeDegPerMm),
    toggleMarginDeg: value("toggleMarginDeg", measures.toggleMarginDeg),
    ...(spring && {
      springLength: value("springLength", spring.length),
      springMotionRatio: value("springMotionRatio", spring.motionRatio),
    }),
  };
}
