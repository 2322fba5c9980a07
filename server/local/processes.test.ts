import { existsSync, mkdtempSync, readFileSync, rmSync } from "node:fs";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { createHeld, freePort, runToEnd, startService, tryPort, whileRunning } from "./processes.ts";

let folder: string;
const service = (program: string) => ({
  ...{ name: "sample", args: ["-e", program], cwd: folder, env: {}, echo: "none" as const },
  log: join(folder, "sample.log"),
});
const never = new AbortController().signal;

beforeAll(() => {
  folder = mkdtempSync(join(tmpdir(), "processes-"));
});
afterAll(() => rmSync(folder, { recursive: true }));

test("a program is asked to stop, and what it says while it stops is in its log", async () => {
  const program = `process.on("SIGTERM", () => { console.log("put away"); process.exit(0); });
    process.send("up"); setInterval(() => {}, 1000);`;
  const sample = startService(service(program));
  expect(await whileRunning(sample, never, sample.message)).toBe("up");
  await sample.stop();
  expect(await sample.exited).toBe("exit code 0");
  expect(readFileSync(sample.log, "utf8")).toBe("put away\n");
});

test("what a program has started and left is ended with it", async () => {
  const program = `const { spawn } = require("node:child_process");
    const left = spawn(process.execPath, ["-e", "setInterval(() => {}, 1000)"]);
    process.send(left.pid); setInterval(() => {}, 1000);`;
  const sample = startService(service(program));
  const left = (await sample.message) as number;
  await sample.stop();
  await expect.poll(() => existsSync(`/proc/${left}/exe`)).toBe(false);
});

test("a program that dies before it is up is named with its last words", async () => {
  const sample = startService(service(`throw new Error("no licence plate")`));
  await expect(whileRunning(sample, never, sample.message)).rejects.toThrow(
    /sample did not start.*no licence plate/s,
  );
});

test("raising stop ends a program that runs to its end, and the wait for it", async () => {
  const stop = new AbortController();
  const end = runToEnd(service("setInterval(() => {}, 1000)"), stop.signal);
  stop.abort(new Error("enough"));
  await expect(end).rejects.toThrow("enough");
});

test("what was started first is stopped last, and once only", async () => {
  const order: string[] = [];
  const held = createHeld();
  for (const name of ["database", "server"]) held.push(async () => void order.push(name));
  await held.stopAll();
  await held.stopAll();
  expect(order).toEqual(["server", "database"]);
});

test("a port in use is found out, and another one taken", async () => {
  const holder = createServer();
  await new Promise<void>((resolve) => holder.listen(0, "127.0.0.1", resolve));
  const { port } = holder.address() as { port: number };
  expect(await tryPort(port, "127.0.0.1")).toBeNull();
  expect(await freePort(port)).not.toBe(port);
  await new Promise((resolve) => holder.close(resolve));
});
