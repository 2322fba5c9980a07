// Where the linkage stands on screen: what a link to a study reproduces, and what one slider moves.

import type { Side } from "@linkwright/kinematics";

export interface Pose {
  /** Name of the ride height the rule's zero stands for; null for the study's first. */
  readonly height: string | null;
  /** Curves of every ride height side by side, not of that one alone. */
  readonly isEveryHeight: boolean;
  /** Wheel travel about that ride height, mm, bump positive. */
  readonly travel: number;
  /** Steering input, positive to the left of the car. */
  readonly steer: number;
  /** The side whose points are listed. */
  readonly side: Side;
}

export const REST_POSE: Pose = { height: null, isEveryHeight: false, travel: 0, steer: 0, side: "left" };

/** Names in the address. `undefined` takes a name out of it. */
export type PoseParams = Readonly<
  Record<"height" | "heights" | "travel" | "steer" | "side", string | undefined>
>;

type RawParams = Readonly<Partial<Record<string, string | string[]>>>;

/** The pose with whatever the address says laid over it; what the address does not name stays. */
export function withParams(pose: Pose, params: RawParams): Pose {
  const height = textOf(params.height);
  const heights = textOf(params.heights);
  const travel = numberOf(params.travel);
  const steer = numberOf(params.steer);
  const side = textOf(params.side);
  return {
    height: height ?? pose.height,
    isEveryHeight: heights === undefined ? pose.isEveryHeight : heights === "all",
    travel: travel ?? pose.travel,
    steer: steer ?? pose.steer,
    side: side === "left" || side === "right" ? side : pose.side,
  };
}

/** What stands at rest is left out, so that a plain address stays plain. */
export function paramsOfPose(pose: Pose): PoseParams {
  return {
    height: pose.height ?? undefined,
    heights: pose.isEveryHeight ? "all" : undefined,
    travel: pose.travel === 0 ? undefined : shortNumber(pose.travel),
    steer: pose.steer === 0 ? undefined : shortNumber(pose.steer),
    side: pose.side === "left" ? undefined : pose.side,
  };
}

export function isSamePose(a: Pose, b: Pose): boolean {
  return (
    a.height === b.height &&
    a.isEveryHeight === b.isEveryHeight &&
    a.travel === b.travel &&
    a.steer === b.steer &&
    a.side === b.side
  );
}

function textOf(param: string | string[] | undefined): string | undefined {
  const text = Array.isArray(param) ? param[0] : param;
  return text === "" ? undefined : text;
}

function numberOf(param: string | string[] | undefined): number | undefined {
  const value = Number(textOf(param) ?? Number.NaN);
  return Number.isFinite(value) ? value : undefined;
}

/** A hundredth of a millimetre: finer than any rule is read, short enough to read out. */
function shortNumber(value: number): string {
  return String(Math.round(value * 100) / 100);
}
