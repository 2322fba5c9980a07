// The axle document's shape, as it comes from a file or a request. Whether the geometry is possible is for
// kinematics' checkAxle to say; the two together are in documents.ts.

import {
  AXLE_FORMAT,
  type Axle,
  type Coordinates,
  type Corner,
  type Spring,
  type Wishbone,
} from "@linkwright/kinematics";
import { z } from "zod";

/** z.number() refuses NaN, ±∞ and numbers written as text. */
const Point3 = z.tuple([z.number(), z.number(), z.number()]) satisfies z.ZodType<Coordinates>;
const Positive = z.number().positive();
const Share = z.number().min(0).max(1);

const WishboneSchema = z.strictObject({
  frontPivot: Point3,
  rearPivot: Point3,
  ballJoint: Point3,
}) satisfies z.ZodType<Wishbone>;

const SuspensionSchema = z.discriminatedUnion("type", [
  z.strictObject({
    type: z.literal("doubleWishbone"),
    lowerArm: WishboneSchema,
    upperArm: WishboneSchema,
  }),
]);

const MountSchema = z.enum(["lowerArm", "upperArm", "knuckle"]);

const SpringSchema = z.strictObject({
  body: Point3,
  lower: Point3,
  on: MountSchema,
  rateNPerMm: z.exactOptional(Positive),
  freeLength: z.exactOptional(Positive),
  openLength: z.exactOptional(Positive),
  closedLength: z.exactOptional(Positive),
}) satisfies z.ZodType<Spring>;

const AntiRollBarSchema = z.strictObject({
  axis: z.tuple([Point3, Point3]),
  arm: Point3,
  link: z.strictObject({ lower: Point3, on: MountSchema }),
  rateNmPerDeg: z.exactOptional(Positive),
});

const ShapeSchema = z.strictObject({
  on: z.enum(["lowerArm", "upperArm", "knuckle", "tieRod", "body"]),
  from: Point3,
  to: Point3,
  radius: Positive,
});

const WheelSchema = z.strictObject({
  centre: Point3,
  toeDeg: z.number().min(-45).max(45),
  camberDeg: z.number().min(-45).max(45),
  loadedRadius: Positive,
  rim: z.exactOptional(z.strictObject({ diameter: Positive, width: Positive, offset: z.number() })),
  tyre: z.exactOptional(z.strictObject({ width: Positive, diameter: Positive })),
});

const CornerSchema = z.strictObject({
  suspension: SuspensionSchema,
  tieRod: z.strictObject({ inner: Point3, outer: Point3 }),
  wheel: WheelSchema,
  spring: z.exactOptional(SpringSchema),
  antiRollBar: z.exactOptional(AntiRollBarSchema),
  shapes: z.exactOptional(z.array(ShapeSchema)),
}) satisfies z.ZodType<Corner>;

const SteeringSchema = z.discriminatedUnion("type", [
  z.strictObject({
    type: z.literal("rack"),
    axis: Point3,
    travel: Positive,
    mmPerTurn: z.exactOptional(Positive),
    wheelLeftMoves: z.exactOptional(z.enum(["left", "right"])),
    bought: z.exactOptional(z.boolean()),
  }),
  z.strictObject({ type: z.literal("fixed") }),
]);

const BodySchema = z.strictObject({
  massKg: z.exactOptional(Positive),
  frontMassShare: z.exactOptional(Share),
  cgHeight: z.exactOptional(Positive),
  frontBrakeShare: z.exactOptional(Share),
  driveShare: z.exactOptional(Share),
  unsprungMassKg: z.exactOptional(Positive),
});

export const AxleSchema = z.strictObject({
  format: z.literal(AXLE_FORMAT),
  name: z.string().trim().min(1).max(120),
  position: z.enum(["front", "rear"]),
  wheelbase: Positive,
  left: CornerSchema,
  right: z.union([z.literal("mirror"), CornerSchema]),
  steering: SteeringSchema,
  body: z.exactOptional(BodySchema),
}) satisfies z.ZodType<Axle>;
