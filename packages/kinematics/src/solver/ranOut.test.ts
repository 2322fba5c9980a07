import { describe, expect, test } from "vitest";
import type { ConstraintRow, Drive } from "../geometry/rows.ts";
import { distance, type Vec3 } from "../geometry/vec3.ts";
import { compileSystem } from "./constraints.ts";
import { rowThatRanOut } from "./ranOut.ts";

const rod = (name: string, bodyPoint: Vec3, knucklePoint: Vec3): ConstraintRow => ({
  kind: "distance",
  name,
  bodyPoint,
  knucklePoint,
  length: distance(bodyPoint, knucklePoint),
});
const post = (name: string, z: number): ConstraintRow => ({
  kind: "pointOnLine",
  name,
  bodyPoint: [0, 0, z],
  linePoint: [0, 0, 0],
  lineDirection: [0, 0, 1],
});
const height: Drive = {
  kind: "drivenPoint",
  name: "height",
  point: [0, 0, 0],
  direction: [0, 0, 1],
  value: 0,
};

describe("the row that ran out", () => {
  test("is the rod that lies in one line with its crank", () => {
    const system = compileSystem(
      [post("foot", -150), post("head", 250), rod("rod", [410, 0, 0], [120, 0, 0])],
      [height],
    );
    expect(rowThatRanOut(system, ["height"])).toBe("rod");
  });

  test("leaves out what it is told to: then it is the end of the post that stands nearer to the rod", () => {
    // By the lever, the foot 150 below the rod carries 250/400 of its force and the head 150/400.
    const system = compileSystem(
      [post("head", 250), post("foot", -150), rod("rod", [410, 0, 0], [120, 0, 0])],
      [height],
    );
    expect(rowThatRanOut(system, ["height", "rod"])).toBe("foot");
  });
});
