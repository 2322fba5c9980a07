import { bumpSteerCurve, type RideHeight } from "@linkwright/kinematics";
import { expect, test } from "vitest";
import { workedAxle, workedStudies } from "../../../../../tests/helpers/workedAxle.ts";
import { DIALECT_WORDS } from "../../../lib/dialect.ts";
import { heightFigures } from "./figures.ts";
import { chooseHeight, heightsOf, ruleRange } from "./heights.ts";
import { lostParts } from "./lost.ts";
import { panelSeries } from "./panelSeries.ts";
import { panelStyle } from "./panels.ts";
import { createSweeper } from "./sweepCache.ts";
import { curvePoints, sweepHeight } from "./sweepHeight.ts";
import { TOE_IN_DEGREES, toeShown, toeUnit } from "./toeDisplay.ts";

const road: RideHeight = { name: "Road", wheelUp: 0, rakeDeg: 0, band: [-50, 50] };
const low: RideHeight = { name: "Low", wheelUp: 40, rakeDeg: 0, band: [-60, 40] };
const RANGE = { from: -60, to: 60 };

test("a study without ride heights stands at its design height", () => {
  expect(heightsOf({ rideHeights: [] })).toMatchObject([{ name: "Design height", wheelUp: 0 }]);
  expect(heightsOf({ rideHeights: [low] })).toEqual([low]);
});

test("a ride height that is no longer there gives way to the first", () => {
  expect(chooseHeight([road, low], "Low")).toBe(low);
  expect(chooseHeight([road, low], "Renamed")).toBe(road);
  expect(chooseHeight([road, low], null)).toBe(road);
});

test("one rule serves all ride heights and shows a little beyond the widest band", () => {
  expect(ruleRange([road, low])).toEqual({ from: -70, to: 60 });
  expect(ruleRange([{ ...road, band: [-5, 5] }])).toEqual({ from: -40, to: 40 });
});

test("the toe curve is toe's change from the ride height, with the rod set there", () => {
  // 24 pieces over 240 mm: the curve has a point at every 10 mm, so at every travel that was worked out.
  const sweep = sweepHeight(workedAxle, low, { from: -120, to: 120 });
  const points = curvePoints(sweep, "toe", "left", TOE_IN_DEGREES);
  const { travels, toeDeg } = workedStudies.rideHeight;
  const atHeight = toeDeg[travels.indexOf(40)] as number;
  for (const [at, travel] of travels.entries()) {
    const found = points.find((point) => Math.abs(point.travel - (travel - 40)) < 1e-9);
    expect(found?.value).toBeCloseTo((toeDeg[at] as number) - atHeight, 7);
  }
  expect(points.find(({ travel }) => travel === 0)?.value).toBe(0);
});

test("the sweep's toe curve agrees with the engine's own bump-steer curve", () => {
  const sweep = sweepHeight(workedAxle, low, RANGE);
  const curve = bumpSteerCurve(workedAxle, "right", 40, sweep.travels);
  const points = curvePoints(sweep, "toe", "right", TOE_IN_DEGREES);
  expect(points.map(({ travel }) => travel)).toEqual(curve.travels);
  for (const [at, { value }] of points.entries()) {
    expect(value).toBeCloseTo(curve.bumpSteerDeg[at] as number, 12);
  }
});

test("toe as a length is measured across the stated diameter", () => {
  expect(toeShown(1, { as: "length", diameter: 400 })).toBeCloseTo(6.98096, 4);
  expect(toeUnit({ as: "length", diameter: 381 }, "inch")).toBe("in at ⌀ 15.0");
  expect(toeUnit(TOE_IN_DEGREES, "mm")).toBe("degrees");
});

test("a tick is told with the decimals it has", () => {
  const { formatTick } = panelStyle("toe", { units: "mm", words: DIALECT_WORDS.uk, toe: TOE_IN_DEGREES });
  expect([0, 0.05, 0.1, -1, 0.125].map(formatTick)).toEqual(["0", "0.05", "0.1", "−1", "0.125"]);
});

test("an earlier drawing that says the same draws no second line", () => {
  const sweep = sweepHeight(workedAxle, road, RANGE);
  const moved = {
    ...workedAxle,
    left: { ...workedAxle.left, tieRod: { inner: [128, 275, 220], outer: [116, 589, 219] } },
  } as typeof workedAxle;
  const request = { sweep, quantity: "toe" as const, toe: TOE_IN_DEGREES };
  const same = panelSeries({
    ...request,
    earlier: [{ label: "rev 1", sweep: sweepHeight(workedAxle, road, RANGE) }],
  });
  const other = panelSeries({
    ...request,
    earlier: [{ label: "rev 1", sweep: sweepHeight(moved, road, RANGE) }],
  });
  expect(same.map(({ id }) => id)).toEqual(["left", "right"]);
  expect(other.map(({ id, look }) => [id, look])).toEqual([
    ["left", "left"],
    ["right", "right"],
    ["rev 1", "faint"],
  ]);
});

test("what a band loses is told by wheel, way and link; what lies beyond the band is no loss", () => {
  const wide = { from: -300, to: 300 };
  expect(lostParts(sweepHeight(workedAxle, road, wide))).toEqual([]);
  const greedy: RideHeight = { ...road, band: [-50, 300] };
  const parts = lostParts(sweepHeight(workedAxle, greedy, wide));
  expect(parts.map(({ side, way }) => [side, way])).toEqual([
    ["left", "bump"],
    ["right", "bump"],
  ]);
  const [first] = parts;
  expect(first?.way === "bump" && first.reached > 50 && first.reached < 300).toBe(true);
});

test("a ride height that is out of reach loses the whole of its band", () => {
  const parts = lostParts(sweepHeight(workedAxle, { ...road, wheelUp: 300 }, RANGE));
  expect(parts.map(({ way }) => way)).toEqual(["whole", "whole"]);
});

test("figures judge the worse side against the target", () => {
  const target = { quantity: "bumpSteerDeg", min: -0.1, max: 0.1 } as const;
  const figures = heightFigures(workedAxle, road, [target]);
  const worst = figures.worstDeg ?? 0;
  expect(worst).toBeGreaterThan(0.1);
  expect(figures.judgement?.verdict).not.toBe("inside");
  expect(figures.judgement?.by).toBeCloseTo(worst - 0.1, 12);
  expect(figures.gradientDegPerMm).toBeGreaterThan(0);
  expect(heightFigures(workedAxle, road, []).judgement).toBeNull();
});

test("a sweeper solves the same curve once, and another one anew", () => {
  const sweep = createSweeper();
  const first = sweep(workedAxle, road, RANGE, 0);
  expect(sweep(workedAxle, road, RANGE, 0)).toBe(first);
  expect(sweep(workedAxle, road, RANGE, 5)).not.toBe(first);
  expect(sweep(workedAxle, road, RANGE, 0)).toBe(first);
  expect(first).toEqual(sweepHeight(workedAxle, road, RANGE));
});
