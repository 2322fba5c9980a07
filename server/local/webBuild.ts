// The web client's export, kept by a hash of everything it is made from: built once for each state of the sources.
import { createHash } from "node:crypto";
import { existsSync, mkdirSync, readdirSync, readFileSync, renameSync, rmSync } from "node:fs";
import { join } from "node:path";
import { type Context, PlainProblem } from "./context.ts";
import { endOfLog, runToEnd } from "./processes.ts";

const SOURCES = ["app", "packages/contract", "packages/kinematics", "package-lock.json"];
const NOT_SOURCES = new Set(["node_modules", "dist", ".expo", "expo-env.d.ts"]);
const NAME = /^[0-9a-f]{16}$/;

function listFiles(path: string): string[] {
  const found = [];
  for (const entry of readdirSync(path, { withFileTypes: true })) {
    if (NOT_SOURCES.has(entry.name) || /\.test\.tsx?$/.test(entry.name)) continue;
    const child = join(path, entry.name);
    if (entry.isDirectory()) found.push(...listFiles(child));
    else found.push(child);
  }
  return found.sort();
}

export function hashSources(root: string, sources: readonly string[] = SOURCES): string {
  const hash = createHash("sha256");
  for (const source of sources) {
    const path = join(root, source);
    const files = source.endsWith(".json") ? [path] : listFiles(path);
    for (const file of files) {
      const content = readFileSync(file);
      hash.update(`${file.slice(root.length)}\n${content.length}\n`).update(content);
    }
  }
  return hash.digest("hex").slice(0, 16);
}

function removeOthers(builds: string, keep: readonly (string | undefined)[]): void {
  for (const name of readdirSync(builds)) {
    const path = join(builds, name);
    const builder = /^next-(\d+)$/.exec(name)?.[1];
    const abandoned = builder !== undefined && !existsSync(`/proc/${builder}`);
    if (abandoned || (NAME.test(name) && !keep.includes(path)))
      rmSync(path, { recursive: true, force: true });
  }
}

async function exportTo(folder: string, context: Context): Promise<void> {
  const log = join(context.dataFolder, "logs/web-build.log");
  const cache = join(context.dataFolder, "cache");
  mkdirSync(cache, { recursive: true });
  const how = await runToEnd(
    {
      name: "web build",
      args: [
        join(context.root, "node_modules/expo/bin/cli"),
        "export",
        "--platform",
        "web",
        "--output-dir",
        folder,
      ],
      cwd: join(context.root, "app"),
      // The bundler keeps its cache in the temporary folder, where another user's would bar this one's.
      env: { EXPO_OFFLINE: "1", EXPO_NO_TELEMETRY: "1", CI: "1", NODE_ENV: "production", TMPDIR: cache },
      log,
      echo: "none",
    },
    context.stop,
  );
  if (how === "exit code 0" && existsSync(join(folder, "index.html"))) return;
  throw new PlainProblem(`The web client does not build (${how}). The end of ${log}:\n${endOfLog(log)}`);
}

/** The folder of the web client as the sources are; built when there is none yet. A running server keeps its own. */
export async function buildWeb(context: Context): Promise<{ folder: string; note: string }> {
  const builds = join(context.root, "app/dist");
  mkdirSync(builds, { recursive: true });
  const folder = join(builds, hashSources(context.root));
  removeOthers(builds, [folder, context.readLock("running.json")?.webFolder]);
  if (existsSync(folder)) return { folder, note: "sources unchanged" };
  const next = join(builds, `next-${process.pid}`);
  try {
    await exportTo(next, context);
    renameSync(next, folder);
  } finally {
    rmSync(next, { recursive: true, force: true });
  }
  return { folder, note: "built" };
}
