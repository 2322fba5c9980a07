// The study document's shape. See axle.ts for what is left to kinematics.

import {
  type Datum,
  type RideHeight,
  STUDY_FORMAT,
  type Study,
  TARGET_QUANTITIES,
  type Target,
} from "@linkwright/kinematics";
import { z } from "zod";
import { AxleSchema } from "./axle.ts";

const RideHeightSchema = z.strictObject({
  name: z.string().trim().min(1).max(60),
  wheelUp: z.number().min(-500).max(500),
  rakeDeg: z.number().min(-20).max(20),
  band: z.tuple([z.number().min(-500).max(500), z.number().min(-500).max(500)]),
}) satisfies z.ZodType<RideHeight>;

const TargetSchema = z.strictObject({
  quantity: z.enum(TARGET_QUANTITIES),
  min: z.number().nullable(),
  max: z.number().nullable(),
}) satisfies z.ZodType<Target>;

const Point3 = z.tuple([z.number(), z.number(), z.number()]);

const DatumSchema = z.strictObject({
  name: z.string().trim().min(1).max(60),
  origin: Point3,
  xAxis: Point3,
  zAxis: Point3,
}) satisfies z.ZodType<Datum>;

/** A list with a place in the format and no use yet: what stands in it would be ignored, so it is refused. */
const notInUse = z.array(z.never()).max(0);

export const StudySchema = z.strictObject({
  format: z.literal(STUDY_FORMAT),
  axle: AxleSchema,
  rideHeights: z.array(RideHeightSchema).max(12),
  targets: z.array(TargetSchema).max(40),
  datum: DatumSchema.nullable(),
  tolerances: notInUse,
  pointNotes: notInUse,
  locks: notInUse,
  parts: notInUse,
  shims: notInUse,
}) satisfies z.ZodType<Study>;
