// A complete double-wishbone corner of our own with published-style results. Left wheel, ISO 8855 axes, mm.
// Worked out by three algorithms (trilateration chain, rigid pose by a general root finder, integrated velocity field)
// in numpy and scipy, and reproduced to 1e-12 by MuJoCo (hinged arms, ball-jointed tie rod, closed by constraints).
// It measures trail and kingpin offset along the car's axes; ours run along the wheel's heading.

import type { Axle } from "@linkwright/kinematics";

export const referenceW1: Axle = {
  format: "linkwright.axle/1",
  name: "Reference case W1",
  position: "front",
  wheelbase: 2400,
  left: {
    suspension: {
      type: "doubleWishbone",
      lowerArm: { frontPivot: [150, 330, 195], rearPivot: [-160, 345, 185], ballJoint: [5, 665, 170] },
      upperArm: { frontPivot: [120, 380, 440], rearPivot: [-130, 390, 425], ballJoint: [-18, 620, 460] },
    },
    tieRod: { inner: [-120, 335, 222], outer: [-125, 640, 215] },
    wheel: {
      centre: [0, 720, 290],
      toeDeg: 0,
      camberDeg: -0.5,
      loadedRadius: 290 / Math.cos((0.5 * Math.PI) / 180),
    },
  },
  right: "mirror",
  steering: { type: "rack", axis: [0, 1, 0], travel: 60 },
};

// travel, toe, camber, caster, kingpin inclination, wheel centre x, y, trail along the car, kingpin offset across the car
const TRAVEL_TABLE = [
  [-60, 0.417705, 1.214902, 4.129143, 7.071227, 2.79393, 714.66846, 16.08967, 31.15895],
  [-40, 0.259677, 0.710477, 4.263395, 7.587751, 1.89419, 717.801, 16.90457, 31.1468],
  [-20, 0.12055, 0.139738, 4.398462, 8.169946, 0.96234, 719.56622, 17.70237, 31.14361],
  [0, 0, -0.5, 4.534656, 8.82038, 0, 720, 18.48276, 31.15148],
  [20, -0.10164, -1.213749, 4.672391, 9.543895, -0.99105, 719.11868, 19.24399, 31.17316],
  [40, -0.18335, -2.008916, 4.812196, 10.347669, -2.00871, 716.92063, 19.98258, 31.21219],
  [60, -0.243321, -2.895607, 4.954756, 11.2415, -3.05044, 713.38639, 20.69279, 31.27326],
] as const;

export const w1TravelRows = TRAVEL_TABLE.map(
  ([travel, toeDeg, camberDeg, casterDeg, kingpinInclinationDeg, x, y, trailAlongCar, offsetAcrossCar]) => ({
    travel,
    angles: { toeDeg, camberDeg, casterDeg, kingpinInclinationDeg },
    wheelCentreXY: [x, y],
    alongCar: { trailAlongCar, offsetAcrossCar },
  }),
);

/** MuJoCo's own digits: toe, camber, wheel centre y, x. */
export const w1PhysicsEngine = [
  { travel: 60, toeDeg: -0.2433212134, camberDeg: -2.8956068521, y: 713.3863889, x: -3.0504446 },
  { travel: -60, toeDeg: 0.4177048401, camberDeg: 1.214901747, y: 714.6684603, x: 2.7939322 },
];

/** Slopes at design, per mm of travel. */
export const w1Slopes = { toe: -0.005560304, camber: -0.033785744, wheelCentreY: -0.011248444 };

/** At design height; steer positive to the left, rack positive to the left. */
export const w1RackRows = [
  { rack: -30, leftSteerDeg: 14.001368, rightSteerDeg: 13.589596, leftCamberDeg: 0.813408 },
  { rack: -20, leftSteerDeg: 9.22196, rightSteerDeg: 9.050067, leftCamberDeg: 0.31092 },
  { rack: -10, leftSteerDeg: 4.571054, rightSteerDeg: 4.52965, leftCamberDeg: -0.124914 },
  { rack: 10, leftSteerDeg: -4.52965, rightSteerDeg: -4.571054, leftCamberDeg: -0.817765 },
  { rack: 20, leftSteerDeg: -9.050067, rightSteerDeg: -9.22196, leftCamberDeg: -1.079823 },
  { rack: 30, leftSteerDeg: -13.589596, rightSteerDeg: -14.001368, leftCamberDeg: -1.286332 },
];

/** Change of toe at −40, 0 and +40 mm of travel when one thing differs and every other length stays. */
export const w1Deviations: readonly {
  readonly what: string;
  readonly deviations?: Readonly<Record<string, number>>;
  readonly tieRodLonger?: number;
  readonly toeChangeDeg: readonly number[];
}[] = [
  {
    what: "the tie rod's inner joint 1 mm higher",
    deviations: { "rack.inner.z": 1 },
    toeChangeDeg: [-0.068905, -0.01118, 0.043891],
  },
  {
    what: "the tie rod's inner joint 1 mm further out",
    deviations: { "rack.inner.y": 1 },
    toeChangeDeg: [0.460089, 0.454258, 0.446928],
  },
  {
    what: "the tie rod's inner joint 1 mm further forward",
    deviations: { "rack.inner.x": 1 },
    toeChangeDeg: [-0.006634, -0.008192, -0.010133],
  },
  { what: "the tie rod 1 mm longer", tieRodLonger: 1, toeChangeDeg: [0.465098, 0.454438, 0.449261] },
];
