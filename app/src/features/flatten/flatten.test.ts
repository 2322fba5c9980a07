import { type Axle, applyMove, bandTravels, flatten } from "@linkwright/kinematics";
import { describe, expect, test } from "vitest";
import { unequalSides } from "../../../../tests/helpers/axles.ts";
import { workedAxle } from "../../../../tests/helpers/workedAxle.ts";
import { heldInWords, leftoverInWords, moveWords, stoppedInWords } from "./flattenWords.ts";
import { fitLeftover } from "./leftover.ts";
import { isMoved, movedAxle, movesReducer, NO_MOVES, searchFor } from "./moves.ts";

const bought: Axle = { ...workedAxle, steering: { type: "rack", axis: [0, 1, 0], travel: 60, bought: true } };
const heights = [{ name: "Road", wheelUp: 0, rakeDeg: 0, band: [-50, 50] as const }];

describe("moves", () => {
  const lifted = movesReducer(NO_MOVES, { type: "moved", move: "rackHeight", mm: 4 });

  test("no move leaves the drawing the very same", () => {
    expect(movedAxle(workedAxle, NO_MOVES)).toBe(workedAxle);
    expect(isMoved(workedAxle, NO_MOVES)).toBe(false);
  });

  test("a move is the engine's own, on both sides of an unequal axle", () => {
    expect(movedAxle(unequalSides, lifted)).toEqual(applyMove(unequalSides, "rackHeight", 4));
  });

  test("what a bought rack forbids counts as not made", () => {
    const wider = movesReducer(NO_MOVES, { type: "moved", move: "innerWidth", mm: 4 });
    expect(isMoved(workedAxle, wider)).toBe(true);
    expect(isMoved(bought, wider)).toBe(false);
    expect(movedAxle(bought, wider)).toBe(bought);
  });

  test("bounds always hold the drawn position", () => {
    const settings = movesReducer(NO_MOVES, {
      type: "boundChanged",
      move: "rackHeight",
      bound: "low",
      mm: 5,
    });
    expect(settings.rackHeight.low).toBe(0);
  });

  test("put back takes every move back and leaves the bounds", () => {
    const narrowed = movesReducer(lifted, { type: "boundChanged", move: "rackHeight", bound: "high", mm: 6 });
    const back = movesReducer(narrowed, { type: "putBack" });
    expect(back.rackHeight).toMatchObject({ mm: 0, high: 6 });
  });

  test("the search starts from the drawing with the held moves made, and leaves out what is barred", () => {
    const ahead = movesReducer(lifted, { type: "moved", move: "rackForeAft", mm: 3 });
    const search = searchFor(bought, ahead, heights);
    expect(search.request.free.map(({ move }) => move)).toEqual(["rackHeight"]);
    expect(search.axle).toEqual(applyMove(bought, "rackForeAft", 3));
    expect(search.drawn).toBe(bought);
  });

  test("an answer sets the moves it speaks of", () => {
    const settings = movesReducer(lifted, { type: "answerTaken", moves: [{ move: "innerWidth", mm: -2 }] });
    expect([settings.rackHeight.mm, settings.innerWidth.mm]).toEqual([4, -2]);
  });
});

describe("what is left of a curve", () => {
  const travels = bandTravels([-40, 50], 5);
  const curve = (of: (travel: number) => number) => fitLeftover(travels, travels.map(of));

  test("a straight line is all slope", () => {
    const left = curve((travel) => 0.002 * travel);
    expect(left?.kind).toBe("slope");
    expect(left?.slopeDegPerMm).toBeCloseTo(0.002, 12);
    expect(left?.bowDeg).toBeCloseTo(0, 12);
    expect(left?.restDeg).toBeCloseTo(0, 12);
  });

  test("a parabola is all bow, as high as its ends stand off its middle", () => {
    const left = curve((travel) => -0.1 * ((travel - 5) / 45) ** 2);
    expect(left?.kind).toBe("bow");
    expect(left?.bowDeg).toBeCloseTo(-0.1, 12);
    expect(left?.slopeDegPerMm).toBeCloseTo(0, 12);
  });

  test("slope and bow are told apart in a curve that has both", () => {
    const left = curve((travel) => 0.003 * travel + 0.02 * ((travel - 5) / 45) ** 2);
    expect(left?.slopeDegPerMm).toBeCloseTo(0.003, 12);
    expect(left?.bowDeg).toBeCloseTo(0.02, 12);
  });

  test("an S is neither", () => {
    expect(curve((travel) => Math.sin((travel - 5) / 9))?.kind).toBe("rest");
  });

  test("what no shop can measure is nothing", () => {
    expect(curve((travel) => 1e-6 * travel)?.kind).toBe("nothing");
  });

  test("two points say nothing of a bow", () => {
    expect(fitLeftover([0, 10], [0, 1])).toBeNull();
  });

  test("the words name the way the toe goes", () => {
    const slope = curve((travel) => -0.002 * travel);
    expect(slope && leftoverInWords(slope, "mm")).toEqual({
      lead: "what is left is mostly a slope: toe-out in bump.",
      detail: "Slope and bow that fit the curve best: slope −0.0020 °/mm, bow 0.000°; 0.000° is neither.",
    });
  });
});

test("a search says which bound holds it, and why it stopped", () => {
  const settings = movesReducer(NO_MOVES, { type: "boundChanged", move: "rackHeight", bound: "high", mm: 1 });
  const only = movesReducer(settings, { type: "freedomChanged", move: "innerWidth", isFree: false });
  const { axle, request } = searchFor(workedAxle, only, heights);
  const outcome = flatten(axle, request);
  if (outcome.status !== "found") throw new Error(outcome.because);
  expect(outcome.moves).toEqual([{ move: "rackHeight", mm: 1 }]);
  expect(heldInWords(outcome, only, axle.steering, "mm")).toEqual([
    "Rack height is held by its upper bound, +1.0 mm: without it the curve would be flatter.",
  ]);
  expect(stoppedInWords(outcome)).toContain("search");
});

test("a toe link has inner joints and no rack", () => {
  expect(moveWords("rackHeight", { type: "fixed" }).name).toBe("Inner joint height");
  expect(moveWords("rackHeight", workedAxle.steering).name).toBe("Rack height");
});
