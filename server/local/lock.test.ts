import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, expect, test } from "vitest";
import { holdLock, processBegan, readLock } from "./lock.mjs";

let folder: string;
let path: string;
const explain = ({ pid, url }: { pid: number; url?: string }) => `held by ${pid} at ${url}`;

beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "lock-"));
  path = join(folder, "running.json");
});
afterEach(() => rmSync(folder, { recursive: true }));

test("a lock that is held is refused with what its holder said of itself", () => {
  const lock = holdLock(path, explain);
  lock.describe({ url: "http://localhost:3000" });
  expect(() => holdLock(path, explain)).toThrow(`held by ${process.pid} at http://localhost:3000`);
  lock.release();
  expect(readLock(path)).toBeNull();
});

test("a holder that has died does not bar the next one, also when its number is in use again", () => {
  writeFileSync(path, JSON.stringify({ pid: process.pid, began: 1 }));
  const lock = holdLock(path, explain);
  expect(lock.stale).toBe(true);
  lock.release();
});

test("a file that was cut off while it was written does not bar the next one", () => {
  writeFileSync(path, '{"pid": 12');
  const lock = holdLock(path, explain);
  expect(lock.stale).toBe(true);
  expect(JSON.parse(readFileSync(path, "utf8")).pid).toBe(process.pid);
  lock.release();
});

test("a release leaves another holder's file alone", () => {
  const lock = holdLock(path, explain);
  writeFileSync(path, JSON.stringify({ pid: process.ppid, began: processBegan(process.ppid) }));
  lock.release();
  expect(readLock(path)?.pid).toBe(process.ppid);
});
