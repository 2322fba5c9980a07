// The reports of both test programs, read into one shape. Whatever is not plainly a pass counts as a failure.
import { existsSync, readFileSync } from "node:fs";

export type SlowTest = { readonly name: string; readonly milliseconds: number };

export type Tally = {
  readonly passed: number;
  readonly failed: number;
  readonly skipped: number;
  readonly tests: readonly SlowTest[];
};

type VitestReport = {
  readonly testResults: readonly {
    readonly name: string;
    readonly status: string;
    readonly assertionResults: readonly {
      readonly fullName: string;
      readonly status: string;
      readonly duration?: number | null;
    }[];
  }[];
};

type PlaywrightSuite = {
  readonly title: string;
  readonly suites?: readonly PlaywrightSuite[];
  readonly specs: readonly {
    readonly title: string;
    readonly tests: readonly {
      readonly projectName: string;
      readonly status: string;
      readonly results: readonly { readonly duration: number }[];
    }[];
  }[];
};

type PlaywrightReport = { readonly suites: readonly PlaywrightSuite[] };

const NOTHING: Tally = { passed: 0, failed: 0, skipped: 0, tests: [] };

export function addTallies(tallies: readonly Tally[]): Tally {
  return tallies.reduce(
    (sum, one) => ({
      passed: sum.passed + one.passed,
      failed: sum.failed + one.failed,
      skipped: sum.skipped + one.skipped,
      tests: [...sum.tests, ...one.tests],
    }),
    NOTHING,
  );
}

export function tallyOne(ok: boolean): Tally {
  return ok ? { ...NOTHING, passed: 1 } : { ...NOTHING, failed: 1 };
}

export function tallyVitest(report: VitestReport, root: string): Tally {
  return addTallies(
    report.testResults.map((file) => {
      const tests = file.assertionResults;
      const count = (statuses: readonly string[]) =>
        tests.filter(({ status }) => statuses.includes(status)).length;
      const [passed, skipped] = [count(["passed"]), count(["pending", "skipped", "todo", "disabled"])];
      const failedTests = tests.length - passed - skipped;
      // A file that cannot be loaded, or whose set-up fails, has no failed test of its own.
      const failed = file.status === "failed" && failedTests === 0 ? 1 : failedTests;
      const path = file.name.replace(`${root}/`, "");
      const slow = tests.map(({ fullName, duration }) => ({
        name: `${path}: ${fullName}`,
        milliseconds: duration ?? 0,
      }));
      return { passed, failed, skipped, tests: slow };
    }),
  );
}

function tallySuite(suite: PlaywrightSuite, path: readonly string[]): Tally {
  const here = [...path, suite.title];
  const own = suite.specs.flatMap((spec) =>
    spec.tests.map((test): Tally => {
      const milliseconds = test.results.reduce((sum, { duration }) => sum + duration, 0);
      const name = `${test.projectName}: ${[...here, spec.title].filter(Boolean).join(" › ")}`;
      if (test.status === "skipped") return { ...NOTHING, skipped: 1 };
      return { ...tallyOne(test.status === "expected"), tests: [{ name, milliseconds }] };
    }),
  );
  return addTallies([...own, ...(suite.suites ?? []).map((inner) => tallySuite(inner, here))]);
}

/** A test that passed only when tried again is a failure. */
export function tallyPlaywright(report: PlaywrightReport): Tally {
  return addTallies(report.suites.map((suite) => tallySuite(suite, [])));
}

/** The tally of a program that ended with `ok`: one that fails without a failed test counts as a failure itself. */
export function readTally<Report>(path: string, ok: boolean, tally: (report: Report) => Tally): Tally {
  if (!existsSync(path)) return tallyOne(false);
  const found = tally(JSON.parse(readFileSync(path, "utf8")) as Report);
  return ok || found.failed > 0 ? found : addTallies([found, tallyOne(false)]);
}

export function slowestTests(tests: readonly SlowTest[], count: number): string[] {
  return [...tests]
    .sort((a, b) => b.milliseconds - a.milliseconds)
    .slice(0, count)
    .map(({ name, milliseconds }) => `${(milliseconds / 1000).toFixed(2).padStart(8)} s  ${name}`);
}
