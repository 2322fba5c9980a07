// Angles change unit here and nowhere else.

declare const unit: unique symbol;
export type Rad = number & { readonly [unit]?: "rad" };
export type Deg = number & { readonly [unit]?: "deg" };

const DEG_PER_RAD = 180 / Math.PI;

export function radFromDeg(angleDeg: Deg): Rad {
  return (angleDeg as number) / DEG_PER_RAD;
}

export function degFromRad(angleRad: Rad): Deg {
  return (angleRad as number) * DEG_PER_RAD;
}
