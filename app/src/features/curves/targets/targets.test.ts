import type { RideHeight, Study, Target } from "@linkwright/kinematics";
import { describe, expect, test } from "vitest";
import { rearFixed } from "../../../../../tests/helpers/axles.ts";
import { workedAxle } from "../../../../../tests/helpers/workedAxle.ts";
import { DIALECT_WORDS } from "../../../lib/dialect.ts";
import { TOE_IN_DEGREES } from "../series/toeDisplay.ts";
import { judge, judgeTargets } from "./judge.ts";
import { panelBand } from "./panelBand.ts";
import { STARTING_TARGETS, withStartingTarget } from "./starting.ts";
import { boundsInWords, formatQuantity, quantityName, verdictInWords } from "./targetWords.ts";

const road: RideHeight = { name: "Road", wheelUp: 0, rakeDeg: 0, band: [-50, 50] };
const low: RideHeight = { name: "Low", wheelUp: 30, rakeDeg: 0, band: [-40, 40] };
const bump: Target = { quantity: "bumpSteerDeg", min: -0.15, max: 0.15 };
const camber: Target = { quantity: "camberDeg", min: -1, max: null };

describe("judging one value", () => {
  const of = (value: number | null) => judge(bump, { value, side: "left" }, "Road");

  test("on a bound is inside, beyond it is outside by the difference", () => {
    expect(of(0.15)).toMatchObject({ verdict: "inside", by: 0 });
    expect(of(0.25)).toMatchObject({ verdict: "above", by: 0.1 });
    expect(of(-0.2).verdict).toBe("below");
    expect(of(-0.2).by).toBeCloseTo(0.05, 12);
  });

  test("a value that does not exist is not called good", () => {
    expect(of(null)).toMatchObject({ verdict: "unknown", by: null });
  });

  test("an open end bounds nothing", () => {
    expect(judge(camber, { value: 12, side: "left" }, "Road")).toMatchObject({ verdict: "inside", by: 13 });
  });
});

test("each target is judged where it is worst of all ride heights", () => {
  const judged = judgeTargets(workedAxle, [road, low], [camber, bump]);
  expect(judged.map(({ target }) => target.quantity)).toEqual(["camberDeg", "bumpSteerDeg"]);
  // Camber grows negative in bump, so the lowered height is the nearer to its bound.
  expect(judged[0]).toMatchObject({ height: "Low" });
  expect(judged[1]?.verdict).not.toBe("inside");
});

test("what an axle does not have cannot be judged", () => {
  const ackermann: Target = { quantity: "ackermannPercent", min: 30, max: null };
  expect(judgeTargets(rearFixed, [road], [ackermann])).toMatchObject([{ verdict: "unknown", value: null }]);
  const [front] = judgeTargets(workedAxle, [road], [ackermann]);
  expect(front?.value).not.toBeNull();
});

test("bounds and verdicts are told in words and in the reader's units", () => {
  expect(boundsInWords(bump, "mm")).toBe("±0.15°");
  expect(boundsInWords(camber, "mm")).toBe("at least −1.00°");
  expect(boundsInWords({ quantity: "track", min: 1270, max: 1295.4 }, "inch")).toBe("50.000 to 51.000 in");
  expect(verdictInWords(judge(bump, { value: 0.1, side: "left" }, "Road"), "mm")).toBe("inside ±0.15°");
  expect(verdictInWords(judge(bump, { value: -0.22, side: "left" }, "Road"), "mm")).toBe("outside by 0.070°");
  expect(verdictInWords(judge(camber, { value: 0, side: "left" }, "Road"), "mm")).toBe(
    "inside: at least −1.00°",
  );
  expect(verdictInWords(judge(camber, { value: -1.5, side: "left" }, "Road"), "mm")).toBe("below by 0.50°");
  expect(verdictInWords(judge(camber, { value: null, side: "left" }, "Road"), "mm")).toBe("cannot be judged");
  expect(formatQuantity("camberChangeDegPerMm", -0.02, "inch")).toBe("−0.508 °/in");
});

test("names follow the dialect", () => {
  expect(quantityName("casterTrail", DIALECT_WORDS.uk)).toBe("Castor trail");
  expect(quantityName("casterTrail", DIALECT_WORDS.us)).toBe("Caster trail");
});

test("the bump-steer band of a panel runs over the ride height's own band", () => {
  const request = { targets: [bump, camber], height: low, range: { from: -60, to: 60 }, toe: TOE_IN_DEGREES };
  expect(panelBand({ ...request, quantity: "toe" })).toEqual({
    min: -0.15,
    max: 0.15,
    fromTravel: -40,
    toTravel: 40,
  });
  expect(panelBand({ ...request, quantity: "camber" })).toMatchObject({ min: -1, max: null });
  expect(panelBand({ ...request, quantity: "track" })).toBeUndefined();
});

test("a starting target sets the bands and leaves other targets alone", () => {
  const study = { rideHeights: [road, low], targets: [camber] } as unknown as Study;
  const [street] = STARTING_TARGETS;
  if (street === undefined) throw new Error("there is a starting target");
  const { targets, rideHeights } = withStartingTarget(study, street);
  expect(targets).toEqual([bump, camber]);
  expect(rideHeights.map(({ name, band }) => [name, band])).toEqual([
    ["Road", [-50, 50]],
    ["Low", [-50, 50]],
  ]);
});
