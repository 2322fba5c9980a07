// The picture of arrows, held against the sources as they are.

import { describe, test } from "vitest";
import { expect } from "../helpers/matchers.ts";
import { parseModules, readSources } from "./modules.ts";
import { type Breach, longFiles, RULES } from "./rules.ts";

const ROOT = new URL("../..", import.meta.url).pathname.replace(/\/$/, "");
const sources = readSources(ROOT);
const modules = parseModules(sources);

const list = (breaches: readonly Breach[]): string =>
  breaches.map(({ where, what }) => `${where} ${what}`).join("\n");

describe("in this repository", () => {
  test("the sources were found", () => {
    const workspaces = new Set(modules.map(({ workspace }) => workspace));
    expect([...workspaces]).toEqual(expect.arrayContaining(["packages/kinematics", "tests"]));
    expect(modules.length).toBeGreaterThan(20);
  });

  test.each(Object.entries(RULES))("%s", (_name, rule) => {
    expect(list(rule(modules, sources))).toBe("");
  });

  test("every relative import leads to a file", () => {
    const lost = modules.flatMap(({ path, imports }) =>
      imports
        .filter(({ specifier, target }) => /^(\.|@\/).*\.(ts|tsx)$/.test(specifier) && target === null)
        .map(({ specifier, line }) => ({ where: `${path}:${line}`, what: `leads nowhere: "${specifier}"` })),
    );
    expect(list(lost)).toBe("");
  });

  test("files too long to read at one sitting are named", () => {
    const reminders = list(longFiles(modules, sources));
    if (reminders !== "") console.warn(`Long files:\n${reminders}`);
    expect(modules.every(({ lineCount }) => lineCount > 0)).toBe(true);
  });
});
