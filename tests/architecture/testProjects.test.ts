// A test that no project runs cannot fail. Vitest itself is asked which files it would run.

import { execFileSync } from "node:child_process";
import { test } from "vitest";
import { expect } from "../helpers/matchers.ts";
import { readSources } from "./modules.ts";

const ROOT = new URL("../..", import.meta.url).pathname.replace(/\/$/, "");

interface Listed {
  readonly file: string;
  readonly projectName?: string;
}

function listedFiles(): Listed[] {
  const vitest = `${ROOT}/node_modules/vitest/vitest.mjs`;
  const options = ["list", "--filesOnly", "--json", "--config", "tests/vitest.config.ts"];
  // A worker of the outer run marks its environment; the inner run must not take itself for one.
  const env = Object.fromEntries(Object.entries(process.env).filter(([name]) => !name.startsWith("VITEST")));
  const output = execFileSync(process.execPath, [vitest, ...options], { cwd: ROOT, env, encoding: "utf8" });
  return JSON.parse(output) as Listed[];
}

test("every test file belongs to exactly one vitest project", () => {
  const listed = listedFiles().map(({ file }) => file.replace(`${ROOT}/`, ""));
  const written = [...readSources(ROOT).keys()].filter((path) => /\.test\.[cm]?tsx?$/.test(path));
  expect(written.filter((path) => !listed.includes(path))).toEqual([]);
  expect(listed.filter((path, index) => listed.indexOf(path) !== index)).toEqual([]);
  expect(written).toContain("tests/architecture/testProjects.test.ts");
}, 30_000);
