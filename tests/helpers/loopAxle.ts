// A loop of two cranks and a rod between ball joints, written as an axle: the lower arm is the driven crank, the
// knuckle the rod, the upper arm the other crank. So a published linkage is solved by the very code that solves a car.

import type { Axle, Coordinates, SideRow } from "@linkwright/kinematics";
import { add, cross, dot, length, scale, subtract, turn, unit, type Vector } from "./closedForm/vector.ts";

/** A crank: a joint that turns about an axis. `joint` is where it stands at angle 0. */
export interface Crank {
  readonly origin: Vector;
  /** Unit. */
  readonly axis: Vector;
  readonly joint: Vector;
}

export const jointAt = ({ origin, axis, joint }: Crank, angleRad: number): Vector =>
  add(origin, turn(subtract(joint, origin), axis, angleRad));

export interface Loop {
  readonly input: Crank;
  readonly output: Crank;
}

/** The loop's own axes as seen from the car: `x`, `y`, `z` are the car's axes in the loop's coordinates. */
interface Placement {
  readonly x: Vector;
  readonly y: Vector;
  readonly z: Vector;
  readonly shift: Vector;
}

export interface PlacedLoop {
  readonly axle: Axle;
  /** Wheel travel that takes the driven crank from the angle the axle is drawn at to `inputRad`. */
  travelTo(inputRad: number): number;
  /** Where the other crank's joint stands, in the loop's coordinates. */
  outputJoint(side: SideRow, inputRad: number): Vector;
  /** Radians of the other crank per radian of the driven one, from the motion ratio of a spring on the other crank. */
  speedRatio(side: SideRow, inputRad: number): number;
  /** Radians of the rod's turning in the cranks' plane per radian of the driven crank; planar loops only. */
  rodSpeedRatio(side: SideRow, inputRad: number): number;
}

/** Far enough from every joint of these loops that the spring's direction is well defined. */
const SPRING_REACH = 900;

/**
 * `loop` drawn at input and output angles that fit together, turned so that between there and `towardsRad` the driven
 * joint rises (or sinks) as straight as it can, and set on the car's left. The wheel centre is the driven joint, so
 * wheel travel drives the crank alone. The tie rod only keeps the rod from spinning about itself: it runs beside one
 * of the cranks and copies it: the driven one only if it stands much better across the rod, for that changes most.
 */
export function placeLoop(
  loop: Loop,
  drawn: { readonly inputRad: number; readonly outputRad: number },
  towardsRad: number,
): PlacedLoop {
  const { input, output } = loop;
  const placement = placeInCar(input, (drawn.inputRad + towardsRad) / 2);
  const toCar = (point: Vector): Coordinates => {
    const at = add(point, placement.shift);
    return [dot(at, placement.x), dot(at, placement.y), dot(at, placement.z)];
  };
  const toLoop = ([x, y, z]: Vector): Vector =>
    add(scale(placement.x, x), add(scale(placement.y, y), scale(placement.z, z)));

  const inputJoint = jointAt(input, drawn.inputRad);
  const outputJoint = jointAt(output, drawn.outputRad);
  const rodLength = length(subtract(outputJoint, inputJoint));
  const rod = unit(subtract(outputJoint, inputJoint));
  const acrossRod = (crank: Crank, joint: Vector): number =>
    length(cross(rod, unit(subtract(joint, centreOf(crank)))));
  const [copied, copiedRad] =
    acrossRod(input, inputJoint) > 2 * acrossRod(output, outputJoint)
      ? [input, drawn.inputRad]
      : [output, drawn.outputRad];
  const aside = scale(copied.axis, 100);
  const onward = unit(cross(output.axis, subtract(outputJoint, output.origin)));
  const springBody = add(outputJoint, scale(onward, SPRING_REACH));

  const arm = (crank: Crank, joint: Vector) => ({
    frontPivot: toCar(add(crank.origin, scale(crank.axis, 150))),
    rearPivot: toCar(add(crank.origin, scale(crank.axis, -150))),
    ballJoint: toCar(joint),
  });
  const axle: Axle = {
    format: "linkwright.axle/1",
    name: "A loop of two cranks and a rod",
    position: "front",
    wheelbase: 2400,
    left: {
      suspension: {
        type: "doubleWishbone",
        lowerArm: arm(input, inputJoint),
        upperArm: arm(output, outputJoint),
      },
      tieRod: {
        outer: toCar(add(jointAt(copied, copiedRad), aside)),
        inner: toCar(add(centreOf(copied), aside)),
      },
      wheel: { centre: toCar(inputJoint), toeDeg: 0, camberDeg: 0, loadedRadius: 300 },
      spring: { body: toCar(springBody), lower: toCar(outputJoint), on: "upperArm" },
    },
    right: "mirror",
    steering: { type: "fixed" },
  };

  const height = (inputRad: number): number => toCar(jointAt(input, inputRad))[2];
  const riseAt = (inputRad: number): number =>
    dot(cross(input.axis, subtract(jointAt(input, inputRad), input.origin)), placement.z);
  const outputAt = (side: SideRow, inputRad: number): Vector =>
    add(jointAt(input, inputRad), scale(toLoop(kingpinOf(side)), rodLength));
  return {
    axle,
    travelTo: (inputRad) => height(inputRad) - height(drawn.inputRad),
    outputJoint: outputAt,
    speedRatio(side, inputRad) {
      const joint = outputAt(side, inputRad);
      const perRadian = cross(output.axis, subtract(joint, output.origin));
      const alongSpring = dot(perRadian, unit(subtract(joint, springBody)));
      return (-side.springMotionRatio! * riseAt(inputRad)) / alongSpring;
    },
    // The wheel's axis starts along Y and turns with the rod about X, the cranks' axis.
    rodSpeedRatio: (side, inputRad) => ((-side.camberChangeDegPerMm! * Math.PI) / 180) * riseAt(inputRad),
  };
}

/** The middle of the circle that the crank's joint goes round. */
function centreOf({ origin, axis, joint }: Crank): Vector {
  return add(origin, scale(axis, dot(subtract(joint, origin), axis)));
}

function placeInCar(input: Crank, halfwayRad: number): Placement {
  const centre = centreOf(input);
  const radius = unit(subtract(jointAt(input, halfwayRad), centre));
  const z = cross(input.axis, radius);
  const [x, y] = [input.axis, cross(z, input.axis)];
  // 1 m to the left and 1 m up: any place where no point of these loops crosses the car's centre plane.
  return { x, y, z, shift: subtract(add(scale(y, 1000), scale(z, 1000)), centre) };
}

/** Unit vector from lower to upper ball joint, from caster and kingpin inclination as a left side tells them. */
export function kingpinOf({ casterDeg, kingpinInclinationDeg }: SideRow): Vector {
  const tangent = (degrees: number): number => Math.tan((degrees * Math.PI) / 180);
  const up = Math.abs(casterDeg!) < 90 ? 1 : -1;
  return unit([-up * tangent(casterDeg!), -up * tangent(kingpinInclinationDeg!), up]);
}
