import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { addTallies, readTally, slowestTests, tallyOne, tallyPlaywright, tallyVitest } from "./report.ts";

const assertion = (status: string, duration: number | null = 1) => ({ fullName: status, status, duration });

describe("the tally of a Vitest report", () => {
  test("counts todo and skipped tests as skipped and everything unknown as failed", () => {
    const file = {
      name: "/r/a.test.ts",
      status: "failed",
      assertionResults: ["passed", "failed", "todo", "pending", "strange"].map((status) => assertion(status)),
    };
    expect(tallyVitest({ testResults: [file] }, "/r")).toMatchObject({ passed: 1, failed: 2, skipped: 2 });
  });

  test("counts a file that could not be loaded as one failure", () => {
    const file = { name: "/r/a.test.ts", status: "failed", assertionResults: [] };
    expect(tallyVitest({ testResults: [file] }, "/r")).toMatchObject({ passed: 0, failed: 1 });
  });
});

describe("the tally of a Playwright report", () => {
  const spec = (status: string) => ({
    title: status,
    tests: [{ projectName: "phone", status, results: [{ duration: 40 }, { duration: 2 }] }],
  });

  test("looks into nested suites and takes a test that passed at its second try for a failure", () => {
    const inner = { title: "inner", specs: [spec("flaky"), spec("skipped")] };
    const report = {
      suites: [{ title: "a.spec.ts", specs: [spec("expected"), spec("unexpected")], suites: [inner] }],
    };
    const tally = tallyPlaywright(report);
    expect(tally).toMatchObject({ passed: 1, failed: 2, skipped: 1 });
    expect(tally.tests.at(-1)).toEqual({ name: "phone: a.spec.ts › inner › flaky", milliseconds: 42 });
  });
});

describe("a program's tally", () => {
  let folder: string;
  beforeAll(() => {
    folder = mkdtempSync(join(tmpdir(), "report-"));
  });
  afterAll(() => rmSync(folder, { recursive: true }));

  test("is one failure when it left no report", () => {
    expect(readTally(join(folder, "none.json"), true, () => tallyOne(true))).toMatchObject({
      passed: 0,
      failed: 1,
    });
  });

  test("has one failure more when it ended badly with no failed test", () => {
    const path = join(folder, "report.json");
    writeFileSync(path, "{}");
    expect(readTally(path, false, () => tallyOne(true))).toMatchObject({ passed: 1, failed: 1 });
    expect(readTally(path, false, () => tallyOne(false))).toMatchObject({ passed: 0, failed: 1 });
    expect(readTally(path, true, () => tallyOne(true))).toMatchObject({ passed: 1, failed: 0 });
  });
});

test("the slowest tests come first, and no more than asked for", () => {
  const { tests } = addTallies([
    { ...tallyOne(true), tests: [{ name: "quick", milliseconds: 5 }] },
    { ...tallyOne(true), tests: [{ name: "slow", milliseconds: 2500 }] },
  ]);
  expect(slowestTests(tests, 1)).toEqual(["    2.50 s  slow"]);
});
