// Plain vectors for the second method. Nothing here is shared with the engine, so that an error in one cannot hide in both.

export type Vector = readonly [number, number, number];

export const add = (a: Vector, b: Vector): Vector => [a[0] + b[0], a[1] + b[1], a[2] + b[2]];
export const subtract = (a: Vector, b: Vector): Vector => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
export const scale = (a: Vector, factor: number): Vector => [a[0] * factor, a[1] * factor, a[2] * factor];
export const dot = (a: Vector, b: Vector): number => a[0] * b[0] + a[1] * b[1] + a[2] * b[2];
export const cross = (a: Vector, b: Vector): Vector => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
export const length = (a: Vector): number => Math.hypot(a[0], a[1], a[2]);
export const distance = (a: Vector, b: Vector): number => length(subtract(a, b));
export const unit = (a: Vector): Vector => scale(a, 1 / length(a));
/** What is left of `a` at right angles to the unit vector `along`. */
export const across = (a: Vector, along: Vector): Vector => subtract(a, scale(along, dot(a, along)));

/** Turns `a` about the unit vector `axis` by the right-hand rule (Rodrigues). */
export function turn(a: Vector, axis: Vector, angleRad: number): Vector {
  const alongAxis = scale(axis, dot(a, axis));
  const acrossAxis = across(a, axis);
  return add(
    alongAxis,
    add(scale(acrossAxis, Math.cos(angleRad)), scale(cross(axis, acrossAxis), Math.sin(angleRad))),
  );
}

/** Turns `a` by the smallest turn that takes the unit vector `from` to the unit vector `to`. */
export function turnFromTo(a: Vector, from: Vector, to: Vector): Vector {
  const normal = cross(from, to);
  const once = cross(normal, a);
  const twice = cross(normal, once);
  return add(a, add(once, scale(twice, 1 / (1 + dot(from, to)))));
}
