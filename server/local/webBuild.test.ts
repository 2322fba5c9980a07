import { mkdirSync, mkdtempSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { hashSources } from "./webBuild.ts";

const SOURCES = ["app", "package-lock.json"];
let root: string;

beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), "web-"));
  mkdirSync(join(root, "app/src"), { recursive: true });
  writeFileSync(join(root, "app/src/a.ts"), "one");
  writeFileSync(join(root, "package-lock.json"), "{}");
});
afterEach(() => rmSync(root, { recursive: true }));

test("the hash follows every source and its name, but no test, package or product of a build", () => {
  const before = hashSources(root, SOURCES);
  for (const folder of ["app/dist", "app/.expo", "app/node_modules"]) mkdirSync(join(root, folder));
  for (const file of ["app/dist/b.js", "app/.expo/c", "app/node_modules/d.js", "app/src/a.test.ts"]) {
    writeFileSync(join(root, file), "anything");
  }
  expect(hashSources(root, SOURCES)).toBe(before);

  writeFileSync(join(root, "package-lock.json"), "{ }");
  const otherLock = hashSources(root, SOURCES);
  renameSync(join(root, "app/src/a.ts"), join(root, "app/src/b.ts"));
  const otherName = hashSources(root, SOURCES);
  writeFileSync(join(root, "app/src/b.ts"), "two");
  const hashes = [before, otherLock, otherName, hashSources(root, SOURCES)];
  expect(new Set(hashes).size).toBe(4);
});
