// Every quantity as this house defines it, with the sign and where the definition comes from. The wording is ours.

import { capitalise, type DialectWord } from "@/lib/dialect.ts";

type Words = Readonly<Record<DialectWord, string>>;

export interface Definition {
  readonly name: string;
  readonly meaning: string;
  /** What a positive number says; null where there is no sign. */
  readonly positive: string | null;
  readonly source: string;
}

export interface DefinitionGroup {
  readonly title: string;
  readonly definitions: readonly Definition[];
}

const ISO = "Axes and vocabulary after ISO 8855:2011";
const TRADE = "Common practice in the trade";
const KINEMATICS = "Follows from the rigid linkage itself";
const ACKERMANN = "Ackermann's condition, as in J. C. Dixon, Suspension Geometry and Computation (2009)";
const ANTI =
  "Usual side-view construction, worked in D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering (2018)";

export function definitionsIn(words: Words): DefinitionGroup[] {
  return [
    axes(words),
    wheelAngles(),
    steeringAxis(words),
    overTravel(words),
    axleQuantities(),
    steering(words),
  ];
}

function axes(words: Words): DefinitionGroup {
  return {
    title: "Axes, sides and travel",
    definitions: [
      {
        name: "Axes",
        meaning:
          "X forward, Y left, Z up, right-handed. The car's centre plane is y = 0; the origin is otherwise free. Lengths are kept in mm whatever unit is shown.",
        positive: null,
        source: ISO,
      },
      {
        name: "Design position",
        meaning:
          "Design ride height with the steering straight ahead. The hardpoints (pick-up points) are written for it.",
        positive: null,
        source: TRADE,
      },
      {
        name: "Wheel travel",
        meaning: "Height of the wheel centre relative to the body, counted from the design position.",
        positive: "in bump; droop is negative",
        source: ISO,
      },
      {
        name: "Contact point",
        meaning: `Lowest point of the circle of the loaded radius about the wheel centre, in the wheel's plane. The ground of a side is level with it. A real ${words.tyre} has a patch, not a point.`,
        positive: null,
        source: TRADE,
      },
      {
        name: "Ride height",
        meaning: `A named height of the wheels with a band of travel about it. There the shop turns the ${words.tieRod} until static toe is right again; a band ends where the linkage does.`,
        positive: "for a lowered car (wheel up)",
        source: TRADE,
      },
    ],
  };
}

function wheelAngles(): DefinitionGroup {
  return {
    title: "Angles of the wheel",
    definitions: [
      {
        name: "Toe",
        meaning:
          "Angle of the wheel's plane to the X axis, seen from above, per wheel. Total toe is left plus right. As a length it is the diameter times the sine, and the diameter is always said.",
        positive: "for toe-in, on both sides",
        source: ISO,
      },
      {
        name: "Steer angle",
        meaning:
          "Turn of the wheel about Z against the same travel and rod length with the steering straight ahead, so that bump steer is not counted in it.",
        positive: "when the wheel points left",
        source: ISO,
      },
      {
        name: "Camber",
        meaning: "Lean of the wheel's plane from upright, seen from the front.",
        positive: "when the top leans outboard",
        source: ISO,
      },
    ],
  };
}

function steeringAxis(words: Words): DefinitionGroup {
  return {
    title: "The steering axis",
    definitions: [
      {
        name: capitalise(words.caster),
        meaning:
          "Lean of the steering axis in the side view, to the body. To the ground it is less by the rake.",
        positive: "when the top of the axis lies rearward",
        source: ISO,
      },
      {
        name: "Kingpin inclination",
        meaning: "Lean of the steering axis in the front view.",
        positive: "when the top lies inboard",
        source: ISO,
      },
      {
        name: `${capitalise(words.caster)} trail`,
        meaning:
          "From the contact point to where the steering axis meets the ground, along the wheel's heading.",
        positive: "when that point lies ahead",
        source: ISO,
      },
      {
        name: "Scrub radius",
        meaning:
          "The same distance across the wheel's heading: the lateral offset at the ground, which is the trade's use of the word. Some standards mean the distance in the plane by it.",
        positive: "when that point lies inboard",
        source: TRADE,
      },
    ],
  };
}

function overTravel(words: Words): DefinitionGroup {
  return {
    title: "Over the travel",
    definitions: [
      {
        name: "Bump steer",
        meaning:
          "Toe at a travel less toe at the ride height, at the same steering input and rod length, per wheel. Its gradient is in degrees per mm or inch of travel.",
        positive: "for toe-in in bump",
        source: TRADE,
      },
      {
        name: "Camber change",
        meaning: "Change of camber per mm or inch of travel.",
        positive: "when the top goes outboard in bump",
        source: KINEMATICS,
      },
      {
        name: "Spring motion ratio",
        meaning:
          "Travel of the spring per travel of the wheel. Wheel rate is the spring's rate times its square, and the spring's force times its change.",
        positive: "when the spring shortens in bump",
        source: "Work balance; in D. C. Barton and J. D. Fieldhouse, Automotive Chassis Engineering (2018)",
      },
      {
        name: "Toggle margin",
        meaning: `Angle between steering arm and ${words.tieRod}, seen along the steering axis, from lying in one line; the worst over travel and lock. Amber below 30°, red below 20°.`,
        positive: null,
        source: "The definition is ours; both limits are common practice",
      },
    ],
  };
}

function axleQuantities(): DefinitionGroup {
  return {
    title: "Of the whole axle",
    definitions: [
      {
        name: "Track",
        meaning: "Distance between both contact points across the car.",
        positive: null,
        source: ISO,
      },
      {
        name: "Roll centre",
        meaning:
          "Where the two lines meet that pass through each contact point at right angles to its path, in the front view; its height is above the line through both contact points. When the lines are within 0.05° of parallel only a height is given.",
        positive: "above the ground; lateral to the left",
        source: `${KINEMATICS}: the kinematic roll centre`,
      },
      {
        name: "Anti-dive",
        meaning:
          "Share of the dive under braking that the front linkage holds: from the side-view path of the contact point (brakes on the wheels), the front brakes' share, the wheelbase and the height of the centre of gravity.",
        positive: "when it resists the dive",
        source: ANTI,
      },
      {
        name: "Anti-lift and anti-squat",
        meaning:
          "The same at the rear: under braking from the path of the contact point, under drive from that of the wheel centre.",
        positive: "when it resists the lift or the squat",
        source: ANTI,
      },
    ],
  };
}

function steering(words: Words): DefinitionGroup {
  return {
    title: "Steering",
    definitions: [
      {
        name: "Steering input",
        meaning: `Travel of the rack along its axis in mm, or turn of the ${words.dropArm} in degrees. Screens say left lock and right lock.`,
        positive: "to the left",
        source: "Our own convention",
      },
      {
        name: "Which way it steers",
        meaning:
          "A rack that is mounted so that turning left steers the car right is a red fault on every screen: a rack made for arms behind the axle does that when it is put ahead unaltered.",
        positive: null,
        source: KINEMATICS,
      },
      {
        name: "Ackermann",
        meaning:
          "Difference of inner and outer steer angle as a share of what true rolling asks for at the inner wheel's angle, with the wheelbase and the distance of the steering axes at the ground. None straight ahead.",
        positive: "100 % is true rolling",
        source: ACKERMANN,
      },
    ],
  };
}
