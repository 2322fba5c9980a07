import {
  type Axle,
  type CornerPlacement,
  degFromRad,
  poseAxle,
  type Rad,
  type Side,
} from "@linkwright/kinematics";
import { type ReactNode, useMemo } from "react";
import { SvgText } from "@/ui/rule/SvgText.tsx";
import { color, font } from "@/ui/theme/tokens.ts";
import { DEMO_TRAVEL } from "./useDemo.ts";

/** Car y → right on the screen: seen from the front, the car's left is on the viewer's right. */
const VIEW = { left: -780, top: -660, width: 1560, height: 720 };

/** The linkage from the front, as scribed lines on dyed steel. */
export function FrontView({ axle, travel }: { axle: Axle; travel: number }) {
  const ghosts = useMemo(
    () =>
      [-DEMO_TRAVEL, DEMO_TRAVEL].map((at) => poseAxle(axle, { travel: { left: at, right: at }, steer: 0 })),
    [axle],
  );
  const pose = useMemo(
    () => poseAxle(axle, { travel: { left: travel, right: travel }, steer: 0 }),
    [axle, travel],
  );
  const wheel = axle.left.wheel;
  const size = { radius: wheel.loadedRadius, width: wheel.tyre?.width ?? 150 };
  return (
    <svg
      viewBox={`${VIEW.left} ${VIEW.top} ${VIEW.width} ${VIEW.height}`}
      width="100%"
      role="img"
      aria-label="The front axle seen from the front"
    >
      {ghosts
        .flatMap((ghost) => [ghost.left, ghost.right])
        .map((corner) =>
          corner ? <Wheel key={`${corner.wheelCentre}`} corner={corner} {...size} isGhost /> : null,
        )}
      <Rack pose={pose} />
      <CornerLines side="right" corner={pose.right} />
      <CornerLines side="left" corner={pose.left} />
      {pose.right ? <Wheel corner={pose.right} {...size} /> : null}
      {pose.left ? <Wheel corner={pose.left} {...size} /> : null}
      <SvgText x={-690} y={40} anchor="middle" size={34} tone="oxide" family={font.head} weight={600}>
        RIGHT
      </SvgText>
      <SvgText x={690} y={40} anchor="middle" size={34} tone="dye" family={font.head} weight={600}>
        LEFT
      </SvgText>
    </svg>
  );
}

type Point = readonly [number, number, number];

interface WheelProps {
  readonly corner: CornerPlacement;
  readonly radius: number;
  readonly width: number;
  readonly isGhost?: boolean;
}

function Wheel({ corner, radius, width, isGhost }: WheelProps) {
  const [, y, z] = corner.wheelCentre;
  const [, ey, ez] = corner.spinAxis;
  const tiltDeg = degFromRad(Math.atan2(-ez * Math.sign(ey), Math.abs(ey)) as Rad);
  return (
    <rect
      x={y - width / 2}
      y={-z - radius}
      width={width}
      height={radius * 2}
      rx={38}
      transform={`rotate(${tiltDeg} ${y} ${-z})`}
      fill="none"
      stroke={color.ink}
      strokeOpacity={isGhost ? 0.22 : 0.7}
      strokeWidth={isGhost ? 3 : 4.5}
    />
  );
}

function Rack({ pose }: { pose: Readonly<Record<Side, CornerPlacement | null>> }) {
  const left = pose.left?.points["tieRod.inner"];
  const right = pose.right?.points["tieRod.inner"];
  return left && right ? <Link from={left} to={right} tone={color.amber} width={16} opacity={0.55} /> : null;
}

const ARMS = ["lowerArm", "upperArm"] as const;

function CornerLines({ side, corner }: { side: Side; corner: CornerPlacement | null }) {
  if (!corner) return null;
  const at = (path: string) => corner.points[path];
  const tone = side === "left" ? color.dye : color.oxide;
  const lines: ReactNode[] = ARMS.flatMap((arm) =>
    ["frontPivot", "rearPivot"].map((pivot) => (
      <Link
        key={arm + pivot}
        from={at(`suspension.${arm}.${pivot}`)}
        to={at(`suspension.${arm}.ballJoint`)}
        tone={tone}
        width={9}
      />
    )),
  );
  const lower = at("suspension.lowerArm.ballJoint");
  const upper = at("suspension.upperArm.ballJoint");
  const outer = at("tieRod.outer");
  return (
    <g>
      {lines}
      <Link from={lower} to={upper} tone={color.ink} width={11} />
      <Link from={lower} to={outer} tone={color.ink} width={9} />
      <Link from={at("tieRod.inner")} to={outer} tone={color.amber} width={8} />
      {Object.entries(corner.points).map(([path, point]) =>
        path === "wheel.centre" ? null : <Mark key={path} point={point} />,
      )}
    </g>
  );
}

interface LinkProps {
  readonly from: Point | undefined;
  readonly to: Point | undefined;
  readonly tone: string;
  readonly width: number;
  readonly opacity?: number;
}

function Link({ from, to, tone, width, opacity }: LinkProps) {
  if (!from || !to) return null;
  return (
    <line
      x1={from[1]}
      y1={-from[2]}
      x2={to[1]}
      y2={-to[2]}
      stroke={tone}
      strokeWidth={width}
      strokeLinecap="round"
      strokeOpacity={opacity}
    />
  );
}

function Mark({ point }: { point: Point }) {
  return (
    <g transform={`translate(${point[1]} ${-point[2]})`}>
      <circle r={13} fill={color.ground} stroke={color.ink} strokeWidth={4} />
      <circle r={4.5} fill={color.ink} />
    </g>
  );
}
