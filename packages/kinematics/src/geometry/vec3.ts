// Points and directions that know their frame: V the car, K the knuckle. A wrong chain does not compile.

declare const meaning: unique symbol;

export type Frame = "V" | "K";
export type Vec3 = readonly [number, number, number];
export type Point<F extends Frame> = Vec3 & { readonly [meaning]?: readonly ["point", F] };
export type Direction<F extends Frame> = Vec3 & { readonly [meaning]?: readonly ["direction", F] };

/** The vector from `from` to `to`. */
export function between<F extends Frame>(from: Point<F>, to: Point<NoInfer<F>>): Direction<F> {
  return [to[0] - from[0], to[1] - from[1], to[2] - from[2]];
}

/** The point that lies `distance` times `along` from `start`. */
export function offsetPoint<F extends Frame>(
  start: Point<F>,
  along: Direction<NoInfer<F>>,
  distance = 1,
): Point<F> {
  return [start[0] + along[0] * distance, start[1] + along[1] * distance, start[2] + along[2] * distance];
}

export function dot(a: Vec3, b: Vec3): number {
  return a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
}

export function cross(a: Vec3, b: Vec3): Vec3 {
  return [a[1] * b[2] - a[2] * b[1], a[2] * b[0] - a[0] * b[2], a[0] * b[1] - a[1] * b[0]];
}

export function add(a: Vec3, b: Vec3): Vec3 {
  return [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
}

export function scale(a: Vec3, factor: number): Vec3 {
  return [a[0] * factor, a[1] * factor, a[2] * factor];
}

export function norm(a: Vec3): number {
  return Math.hypot(a[0], a[1], a[2]);
}

export function distance<F extends Frame>(a: Point<F>, b: Point<NoInfer<F>>): number {
  return Math.hypot(b[0] - a[0], b[1] - a[1], b[2] - a[2]);
}

/** Null where the vector has no direction. */
export function findUnit(a: Vec3): Vec3 | null {
  const length = norm(a);
  return length > 0 ? scale(a, 1 / length) : null;
}

/** Some unit vector at right angles to a unit vector; which one is fixed by the vector alone. */
export function perpendicularTo(unit: Vec3): Vec3 {
  const [x, y, z] = [Math.abs(unit[0]), Math.abs(unit[1]), Math.abs(unit[2])];
  const least: Vec3 = x <= y && x <= z ? [1, 0, 0] : y <= z ? [0, 1, 0] : [0, 0, 1];
  const across = cross(unit, least);
  return scale(across, 1 / norm(across));
}
