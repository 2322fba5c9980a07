import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { findMismatch } from "./npmPackages.mjs";

const LOCK = {
  "": { name: "root" },
  app: { version: "0.1.0" },
  "node_modules/@x/app": { resolved: "app", link: true },
  "node_modules/zod": { version: "4.0.0", integrity: "sha512-a" },
  "node_modules/other-system": { version: "1.0.0", integrity: "sha512-b", optional: true },
};
const INSTALLED = {
  "node_modules/@x/app": LOCK["node_modules/@x/app"],
  "node_modules/zod": LOCK["node_modules/zod"],
};

let root: string;
const write = (name: string, packages: object) =>
  writeFileSync(join(root, name), JSON.stringify({ packages }));

beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), "npm-"));
  mkdirSync(join(root, "node_modules"));
  write("package-lock.json", LOCK);
});
afterEach(() => rmSync(root, { recursive: true }));

test("packages as in the lock match, without the optional ones of other systems", () => {
  write("node_modules/.package-lock.json", INSTALLED);
  expect(findMismatch(root)).toBeNull();
});

test.each([
  ["nothing installed, or an installation cut off", null, "not installed yet"],
  [
    "a package missing",
    { "node_modules/@x/app": INSTALLED["node_modules/@x/app"] },
    "node_modules/zod is missing",
  ],
  ["another version", { ...INSTALLED, "node_modules/zod": { version: "4.0.1" } }, "node_modules/zod differs"],
  [
    "other content under the same version",
    { ...INSTALLED, "node_modules/zod": { version: "4.0.0", integrity: "sha512-c" } },
    "node_modules/zod differs",
  ],
  [
    "one too many",
    { ...INSTALLED, "node_modules/left": { version: "1.0.0" } },
    "node_modules/left is not in the lock",
  ],
])("%s is a mismatch", (_, installed, expected) => {
  if (installed) write("node_modules/.package-lock.json", installed);
  expect(findMismatch(root)).toBe(expected);
});

test("a lock that cannot be read is named", () => {
  writeFileSync(join(root, "package-lock.json"), "<<<<<<< ours");
  expect(() => findMismatch(root)).toThrow(join(root, "package-lock.json"));
});
