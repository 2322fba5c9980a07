import { PROBLEM_CODES } from "@linkwright/contract";
import { expect, test } from "vitest";
import { ApiProblem, explain, isPassing, type ProblemKind } from "./problem.ts";

const problemOf = (kind: ProblemKind, extra = {}) =>
  new ApiProblem({ kind, title: "Title", detail: "Detail.", ...extra });

test("what the server says is shown as it says it", () => {
  expect(explain(problemOf("not_allowed", { requestId: "r1" }))).toEqual({
    title: "Title",
    detail: "Detail.",
    advice: undefined,
    reference: "r1",
  });
});

test("waiting is told in seconds, and in minutes when it is long", () => {
  expect(explain(problemOf("too_many_attempts", { retryAfterSeconds: 30 })).advice).toBe(
    "Try again in 30 seconds.",
  );
  expect(explain(problemOf("too_many_attempts", { retryAfterSeconds: 601 })).advice).toBe(
    "Try again in 11 minutes.",
  );
});

test("an error of the page itself still says what to do", () => {
  expect(explain(new Error("boom"))).toMatchObject({ detail: "boom", advice: expect.stringMatching(/anew/) });
  expect(explain("boom").detail).toBe("The cause is not known.");
});

test("only what may pass by itself is tried again", () => {
  const passing = [...PROBLEM_CODES, "offline", "timeout", "unreachable", "unexpected_answer"].filter(
    (kind) => isPassing(problemOf(kind as ProblemKind)),
  );
  expect(passing).toEqual(["unavailable", "offline", "timeout", "unreachable"]);
});
