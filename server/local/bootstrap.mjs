// The one door of `npm start`, `npm run dev` and `npm test`. It runs before any npm package is there, so this file and
// the .mjs files beside it use Node alone: they make the machine ready, then hand over to a TypeScript program.
// Arguments: the Debian packages it needs, the program, and what the program gets.
import { mkdirSync } from "node:fs";
import { constants } from "node:os";
import { dirname, join, resolve } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { ensureDebianPackages, findMissing } from "./debianPackages.mjs";
import { holdLock, readLock } from "./lock.mjs";
import { ensureNpmPackages, findMismatch } from "./npmPackages.mjs";
import { createSteps, PlainProblem } from "./steps.mjs";

const OLDEST_NODE = [20, 19, 4];
const SAME_WISH_MS = 1000;
const root = resolve(dirname(fileURLToPath(import.meta.url)), "../..");
const dataFolder = join(root, ".data");

/**
 * One signal for the whole run: the first Ctrl-C stops in order, a later one leaves the children to the kernel. npm hands
 * Ctrl-C on though the terminal has sent it already, so that what follows at once is the same wish and not a second one.
 */
function listenForStop() {
  const stop = new AbortController();
  let patienceUntil = Number.POSITIVE_INFINITY;
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) {
    process.on(signal, () => {
      if (!stop.signal.aborted) patienceUntil = performance.now() + SAME_WISH_MS;
      stop.abort(signal);
      if (performance.now() < patienceUntil) return;
      process.stderr.write("\nStopping at once.\n");
      process.exit(128 + constants.signals[signal]);
    });
  }
  return stop.signal;
}

function requireNode() {
  const have = process.versions.node.split(".").map(Number);
  const at = OLDEST_NODE.findIndex((part, index) => have[index] !== part);
  if (at !== -1 && have[at] < OLDEST_NODE[at]) {
    throw new PlainProblem(
      `Node ${process.versions.node} is too old: install Node 20 (at least ${OLDEST_NODE.join(".")}) and run this again.`,
    );
  }
}

function makeDataFolder() {
  try {
    mkdirSync(join(dataFolder, "logs"), { recursive: true });
  } catch (error) {
    throw new PlainProblem(
      `This user may not write ${dataFolder} (${error.code}): run as the user who owns the folder, or as root.`,
    );
  }
}

async function makeReady(needs, context) {
  if (findMissing(needs).length === 0 && findMismatch(root) === null) return;
  const lock = holdLock(
    join(dataFolder, "setup.json"),
    (holder) =>
      `Another set-up is at work in this folder (process ${holder.pid}): wait until it is through, then run this again.`,
  );
  try {
    await ensureDebianPackages(needs, context);
    await ensureNpmPackages({ ...context, running: readLock(join(dataFolder, "running.json")) });
  } finally {
    lock.release();
  }
}

async function main() {
  const stop = listenForStop();
  const [needs, program, ...args] = process.argv.slice(2);
  const locks = {
    holdLock: (name, explain) => holdLock(join(dataFolder, name), explain),
    readLock: (name) => readLock(join(dataFolder, name)),
  };
  const context = { root, dataFolder, stop, args, ...createSteps(stop), ...locks };
  try {
    requireNode();
    makeDataFolder();
    context.say(`Linkwright in ${root}`);
    await makeReady(needs.split(","), context);
    stop.throwIfAborted();
    const { register } = await import("tsx/esm/api");
    register();
    const { run } = await import(pathToFileURL(join(root, program)).href);
    return await run(context);
  } catch (error) {
    if (stop.aborted) return 128 + constants.signals[stop.reason];
    process.stderr.write(
      error?.name?.endsWith("Problem") ? `\n${error.message}\n` : `\n${error?.stack ?? error}\n`,
    );
    return 1;
  } finally {
    if (stop.aborted) context.say("Stopped.");
  }
}

process.exitCode = await main();
