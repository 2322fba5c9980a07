// The stages of a full run. Each answers a tally; none is left out without a word.
import { cpSync, existsSync, mkdirSync, readdirSync, rmSync } from "node:fs";
import { join } from "node:path";
import { startCluster, temporaryPlace } from "@linkwright/db/postgres";
import {
  buildWeb,
  type Context,
  createHeld,
  freePort,
  runToEnd,
  type Settings,
  startServices,
} from "@linkwright/server/local";
import { readTally, type Tally, tallyOne, tallyPlaywright, tallyVitest } from "./report.ts";

const MINUTE_MS = 60_000;

type Tool = {
  readonly name: string;
  readonly command?: string;
  readonly args: readonly string[];
  readonly env?: Readonly<Record<string, string | undefined>>;
  /** A tool that hangs is ended and counts as failed. */
  readonly limitMs: number;
};

async function runTool(tool: Tool, context: Context): Promise<boolean> {
  const limit = AbortSignal.timeout(tool.limitMs);
  const ended = AbortSignal.any([context.stop, limit]);
  const log = join(context.dataFolder, "logs", `test-${tool.name}.log`);
  const env = { ...tool.env, FORCE_COLOR: undefined, NO_COLOR: "1" };
  try {
    const how = await runToEnd({ ...tool, cwd: context.root, env, log, echo: "bare" }, ended);
    return how === "exit code 0";
  } catch (error) {
    context.stop.throwIfAborted();
    if (!limit.aborted) throw error;
    context.say(`${tool.name} was ended: it took longer than ${tool.limitMs / MINUTE_MS} minutes.`);
    return false;
  }
}

/** A folder for reports that is empty at the start of the run. */
function reportFile(context: Context, name: string): string {
  const folder = join(context.root, "test-results/reports");
  mkdirSync(folder, { recursive: true });
  const file = join(folder, name);
  rmSync(file, { force: true });
  return file;
}

export async function checkTypes(context: Context): Promise<Tally> {
  const args = ["run", "--silent", "typecheck"];
  return tallyOne(await runTool({ name: "types", command: "npm", args, limitMs: 4 * MINUTE_MS }, context));
}

export async function checkStyle(context: Context): Promise<Tally> {
  const args = ["run", "--silent", "lint"];
  return tallyOne(await runTool({ name: "lint", command: "npm", args, limitMs: MINUTE_MS }, context));
}

/** Unit and API tests. The cluster is started here, so that it is gone afterwards even when Vitest is cut off. */
export async function runVitest(context: Context): Promise<Tally> {
  const place = temporaryPlace();
  const held = createHeld();
  held.push(async () => rmSync(place.folder, { recursive: true, force: true }));
  try {
    const cluster = await startCluster(place, { durable: false, log: join(place.folder, "postgres.log") });
    held.push(cluster.stop);
    const report = reportFile(context, "vitest.json");
    const args = [
      join(context.root, "node_modules/vitest/vitest.mjs"),
      ...["run", "--config", "tests/vitest.config.ts"],
      ...["--reporter=default", "--reporter=json", `--outputFile.json=${report}`],
    ];
    const env = { TEST_DATABASE_ADMIN_URL: cluster.adminUrl };
    const ok = await runTool({ name: "vitest", args, env, limitMs: 6 * MINUTE_MS }, context);
    return readTally(report, ok, (found: Parameters<typeof tallyVitest>[0]) =>
      tallyVitest(found, context.root),
    );
  } finally {
    await held.stopAll();
  }
}

function hasSpecs(context: Context): boolean {
  const folder = join(context.root, "e2e/specs");
  return existsSync(folder) && readdirSync(folder).some((name) => name.endsWith(".spec.ts"));
}

/** Playwright against the real server, worker, mail and storage, on data that are made for it and removed after it. */
export async function runEndToEnd(
  context: Context,
  webFolder: string,
  extraArgs: readonly string[],
): Promise<Tally> {
  const place = temporaryPlace();
  const held = createHeld();
  const port = await freePort(0);
  const settings: Settings = {
    ...{ folder: place.folder, place, durable: false, watch: false, webFolder },
    ...{ port, host: "127.0.0.1", publicUrl: `http://localhost:${port}` },
  };
  held.push(async () => rmSync(place.folder, { recursive: true, force: true }));
  held.push(async () =>
    cpSync(join(place.folder, "logs"), join(context.root, "test-results/logs"), { recursive: true }),
  );
  try {
    const running = await startServices(settings, context, held);
    const report = reportFile(context, "playwright.json");
    const args = [
      join(context.root, "node_modules/@playwright/test/cli.js"),
      ...["test", "--config", "e2e/playwright.config.ts", "--reporter=list,json", ...extraArgs],
    ];
    if (!hasSpecs(context)) {
      context.say("There is no end-to-end spec yet.");
      args.push("--pass-with-no-tests");
    }
    const env = {
      E2E_BASE_URL: settings.publicUrl,
      E2E_MAIL_URL: running.mailUrl,
      E2E_ACCOUNTS: JSON.stringify(running.accounts),
      PLAYWRIGHT_JSON_OUTPUT_FILE: report,
    };
    const ok = await runTool({ name: "playwright", args, env, limitMs: 8 * MINUTE_MS }, context);
    return readTally(report, ok, tallyPlaywright);
  } finally {
    await held.stopAll();
  }
}

export { buildWeb };
