// `npm start`: everything on one machine, with the people's data kept in `.data`.
import { join } from "node:path";
import { choosePlace } from "@linkwright/db/postgres";
import { type Context, columns, type HeldLock, PlainProblem } from "./context.ts";
import { createHeld, endOfLog, tryPort } from "./processes.ts";
import { type Ended, type Running, type Settings, startServices } from "./services.ts";
import { buildWeb } from "./webBuild.ts";

const DEFAULT_PORT = 3000;

export async function choosePort(
  name: string,
  fallback: number,
  host: string,
  command: string,
): Promise<number> {
  const text = process.env[name] ?? String(fallback);
  const port = Number(text);
  if (!Number.isInteger(port) || port < 1 || port > 65_534) {
    throw new PlainProblem(
      `${name}=${text} is not a port: give a whole number from 1 to 65534, such as ${fallback}.`,
    );
  }
  if ((await tryPort(port, host)) === null) {
    throw new PlainProblem(
      `Port ${port} on ${host} is in use or not allowed: stop what uses it, or choose another, as in ${name}=${port + 10} ${command}`,
    );
  }
  return port;
}

/** One program of this kind at a time: they share the data. */
export function holdFolder(context: Context): HeldLock {
  return context.holdLock(
    "running.json",
    ({ pid, url }) =>
      `Linkwright already runs from this folder${url ? ` at ${url}` : ""} (process ${pid}): use that one, or stop it with \`kill ${pid}\`.`,
  );
}

/** Waits for Ctrl-C or for one of the programs to end by itself; answers the exit status. */
export async function waitForEnd(running: Running, context: Context): Promise<number> {
  const stopped = new Promise<null>((resolve) => {
    if (context.stop.aborted) resolve(null);
    context.stop.addEventListener("abort", () => resolve(null), { once: true });
  });
  const ended: Ended | null = await Promise.race([running.firstEnd, stopped]);
  if (ended === null) {
    context.say("\nStopping …");
    return 0;
  }
  context.say(
    `\nThe ${ended.name} ended by itself (${ended.how}), so everything is stopped. The end of ${ended.log}:`,
  );
  context.say(endOfLog(ended.log));
  return 1;
}

export function showAccounts(running: Running): string {
  const rows = running.accounts.map(({ email, password, role, workshop }) =>
    [role, email, password, workshop].map(String),
  );
  return rows.length === 0 ? "" : `\nDemo accounts (role, e-mail, password, workshop):\n${columns(rows)}\n`;
}

export async function run(context: Context): Promise<number> {
  const host = process.env.HOST ?? "127.0.0.1";
  const lock = holdFolder(context);
  const held = createHeld();
  try {
    const port = await choosePort("PORT", DEFAULT_PORT, host, "npm start");
    if (lock.stale)
      context.say("  The last start was not stopped in order; its stale lock file was cleared.");
    const web = await context.step("Building the web client", () => buildWeb(context));
    const settings: Settings = {
      folder: context.dataFolder,
      place: await choosePlace(context.root, join(context.dataFolder, "postgres")),
      durable: true,
      port,
      host,
      publicUrl:
        process.env.PUBLIC_URL ??
        `http://${host === "127.0.0.1" || host === "0.0.0.0" ? "localhost" : host}:${port}`,
      webFolder: web.folder,
      watch: false,
    };
    const running = await startServices(settings, context, held);
    lock.describe({ url: settings.publicUrl, webFolder: web.folder });
    const addresses = [
      ["Linkwright", settings.publicUrl],
      ["Its mail", running.mailUrl],
      ["Data and logs", context.dataFolder],
    ];
    context.say(
      `\nReady after ${process.uptime().toFixed(1)} s. Ctrl-C stops everything.\n${columns(addresses)}\n${showAccounts(running)}`,
    );
    return await waitForEnd(running, context);
  } finally {
    await held.stopAll();
    lock.release();
  }
}
