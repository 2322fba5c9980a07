// Where a body is: X_VK carries a point of the knuckle to the car. At the design position it is the identity.

import { IDENTITY_ROTATION, type Quaternion, rotate } from "./rotation.ts";
import type { Direction, Frame, Point, Vec3 } from "./vec3.ts";

declare const frames: unique symbol;

export interface Pose<To extends Frame, From extends Frame> {
  readonly rotation: Quaternion;
  readonly translation: Vec3;
  readonly [frames]?: readonly [To, From];
}

export const DESIGN_POSE: Pose<"V", "K"> = { rotation: IDENTITY_ROTATION, translation: [0, 0, 0] };

export function transformPoint<To extends Frame, From extends Frame>(
  pose: Pose<To, From>,
  point: Point<NoInfer<From>>,
): Point<To> {
  const turned = rotate(pose.rotation, point);
  const { translation } = pose;
  return [turned[0] + translation[0], turned[1] + translation[1], turned[2] + translation[2]];
}

export function transformDirection<To extends Frame, From extends Frame>(
  pose: Pose<To, From>,
  direction: Direction<NoInfer<From>>,
): Direction<To> {
  return rotate(pose.rotation, direction);
}
