// The npm packages of the lock: installed anew whenever what is on the disk is not what the lock asks for.
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { lastLines, runCommand } from "./commands.mjs";
import { PlainProblem } from "./steps.mjs";

function readPackages(path) {
  try {
    return JSON.parse(readFileSync(path, "utf8")).packages;
  } catch {
    return null;
  }
}

/**
 * Why node_modules is not what the lock asks for, or null when it is. npm writes its own record of what it installed as
 * its last act, so an installation that was cut off has none. Optional packages of other systems are left out by npm.
 */
export function findMismatch(root) {
  const wanted = readPackages(join(root, "package-lock.json"));
  if (!wanted)
    throw new PlainProblem(`${join(root, "package-lock.json")} cannot be read: restore it from git.`);
  const installed = readPackages(join(root, "node_modules/.package-lock.json"));
  if (!installed) return "not installed yet";
  for (const [path, entry] of Object.entries(wanted)) {
    if (!path.startsWith("node_modules/") && !path.includes("/node_modules/")) continue;
    const have = installed[path];
    if (!have && !entry.optional) return `${path} is missing`;
    if (
      have &&
      (have.version !== entry.version || have.integrity !== entry.integrity || have.link !== entry.link)
    ) {
      return `${path} differs`;
    }
  }
  const extra = Object.keys(installed).find((path) => path.includes("node_modules/") && !wanted[path]);
  return extra ? `${extra} is not in the lock` : null;
}

export async function ensureNpmPackages(context) {
  const mismatch = findMismatch(context.root);
  if (!mismatch) return;
  if (context.running) {
    throw new PlainProblem(
      `node_modules must be installed anew (${mismatch}), but Linkwright is running from it (process ${context.running.pid}): stop that first.`,
    );
  }
  await context.step(`Installing the npm packages of the lock (${mismatch})`, async () => {
    // Said in full because `npm --silent` and NODE_ENV=production are handed down in the environment.
    const args = ["ci", "--include=dev", "--no-audit", "--no-fund", "--loglevel=warn"];
    const { code, output, log } = await runCommand("npm", args, context);
    context.stop.throwIfAborted();
    if (code !== 0) {
      throw new PlainProblem(
        `npm ci failed (exit ${code}). Its last lines, the rest is in ${log}:\n${lastLines(output, 8)}`,
      );
    }
  });
}
