import { expect, test } from "vitest";
import { formatPath } from "./issue.ts";

test("a path is written with dots for members and brackets for places in a list", () => {
  expect(formatPath(["left", "tieRod", "inner"])).toBe("left.tieRod.inner");
  expect(formatPath(["rideHeights", 0, "band"])).toBe("rideHeights[0].band");
  expect(formatPath([2, "name"])).toBe("[2].name");
});

test("the root is called the document", () => {
  expect(formatPath([])).toBe("document");
});
