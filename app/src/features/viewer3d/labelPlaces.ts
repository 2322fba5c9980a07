import type { Label } from "./parts.ts";
import { dot, type Vec3 } from "./vectors.ts";

/** Cosine of the angle within which the eye looks along the car's width, and LEFT and RIGHT fall on one another. */
const ALONG = 0.94;

/** Of LEFT and RIGHT only the nearer is shown in a view from the side; `towards` points at the eye. */
export function labelIsShown(label: Label, towards: Vec3): boolean {
  return label.text === "FRONT" || dot(label.outward, towards) > -ALONG;
}
