// The programs this one starts, waits for and stops. None outlives it: the kernel ends them when it dies.
import { spawn } from "node:child_process";
import { createWriteStream, existsSync, readFileSync, renameSync } from "node:fs";
import { createServer } from "node:net";
import { createInterface } from "node:readline";
import { PlainProblem } from "./context.ts";

export type Service = {
  readonly name: string;
  readonly pid: number;
  readonly log: string;
  /** How it ended, in words; never rejects. */
  readonly exited: Promise<string>;
  hasExited(): boolean;
  /** The first message it sends to its parent. */
  readonly message: Promise<unknown>;
  stop(): Promise<void>;
};

export type ServiceOptions = {
  readonly name: string;
  /** Node when absent. */
  readonly command?: string;
  readonly args: readonly string[];
  readonly cwd: string;
  readonly env: Readonly<Record<string, string | undefined>>;
  readonly log: string;
  /** Whether its lines also go to the terminal: under its name, or bare when it is the only one that speaks. */
  readonly echo: "named" | "bare" | "none";
};

const STOP_TIMEOUT_MS = 40_000; // the job worker lets the job it is at come to its end
const PATIENCE_MS = 3_000;

/** Ends what the program itself has started and left. Its group is its own, so nobody else is in it. */
function killGroup(pid: number): void {
  try {
    process.kill(-pid, "SIGKILL");
  } catch {
    // Nobody is left in the group, as it should be.
  }
}

export function startService(options: ServiceOptions): Service {
  if (existsSync(options.log)) renameSync(options.log, `${options.log}.previous`);
  const log = createWriteStream(options.log, { mode: 0o600 });
  // A session of its own: Ctrl-C at the terminal reaches this process alone, which stops the others in order.
  const child = spawn(
    "setpriv",
    ["--pdeathsig", "TERM", "--", options.command ?? process.execPath, ...options.args],
    {
      cwd: options.cwd,
      env: { ...process.env, ...options.env },
      stdio: ["ignore", "pipe", "pipe", "ipc"],
      detached: true,
    },
  );
  const pid = child.pid;
  if (pid === undefined) throw new PlainProblem("`setpriv` is missing: apt-get install -y util-linux");
  const keep = (line: string) => {
    log.write(`${line}\n`);
    if (options.echo !== "none")
      process.stdout.write(options.echo === "named" ? `${options.name} | ${line}\n` : `${line}\n`);
  };
  for (const stream of [child.stdout, child.stderr]) if (stream) createInterface(stream).on("line", keep);
  let ended = false;
  const exited = new Promise<string>((resolve) => {
    child.once("exit", () => {
      ended = true;
      killGroup(pid); // whoever is left there would also hold our pipes open
    });
    child.once("close", (code, signal) => {
      log.end(() => resolve(signal ? `signal ${signal}` : `exit code ${code}`));
    });
  });
  const stop = async () => {
    if (!ended) child.kill("SIGTERM");
    const tell = setTimeout(() => {
      process.stdout.write(`Waiting for the ${options.name} to finish; Ctrl-C stops at once.\n`);
    }, PATIENCE_MS);
    const hurry = setTimeout(() => killGroup(pid), STOP_TIMEOUT_MS);
    await exited;
    clearTimeout(tell);
    clearTimeout(hurry);
  };
  const message = new Promise<unknown>((resolve) => child.once("message", resolve));
  return { name: options.name, pid, log: options.log, exited, hasExited: () => ended, message, stop };
}

export function endOfLog(log: string, count = 20): string {
  const text = existsSync(log) ? readFileSync(log, "utf8").trimEnd() : "";
  return text.split("\n").slice(-count).join("\n");
}

/** Waits for `work`, unless the service ends or the person stops everything before. */
export async function whileRunning<T>(service: Service, stop: AbortSignal, work: Promise<T>): Promise<T> {
  const died = service.exited.then((how) => {
    throw new PlainProblem(
      `The ${service.name} did not start (${how}). The end of ${service.log}:\n${endOfLog(service.log)}`,
    );
  });
  const stopped = new Promise<never>((_, reject) => {
    stop.addEventListener("abort", () => reject(stop.reason), { once: true });
  });
  stop.throwIfAborted();
  return Promise.race([work, died, stopped]);
}

/** Runs a program of Node's to its end, with all it says in its log. Stopping everything ends it too. */
export async function runToEnd(options: ServiceOptions, stop: AbortSignal): Promise<string> {
  stop.throwIfAborted();
  const service = startService(options);
  const end = () => void service.stop();
  stop.addEventListener("abort", end, { once: true });
  const how = await service.exited;
  stop.removeEventListener("abort", end);
  stop.throwIfAborted();
  return how;
}

/** What was started, so that it is stopped in the opposite order, whatever happens in between. */
export type Held = { push(stop: () => Promise<void>): void; stopAll(): Promise<void> };

export function createHeld(): Held {
  const stops: (() => Promise<void>)[] = [];
  return {
    push: (stop) => void stops.push(stop),
    async stopAll() {
      for (let stop = stops.pop(); stop; stop = stops.pop()) await stop();
    },
  };
}

/** The port when it is free on `host`, else null; 0 asks for any free one. */
export function tryPort(port: number, host: string): Promise<number | null> {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once("error", () => resolve(null));
    probe.listen(port, host, () => {
      const address = probe.address();
      probe.close(() => resolve(typeof address === "object" && address ? address.port : null));
    });
  });
}

export async function freePort(preferred: number): Promise<number> {
  const port = (await tryPort(preferred, "127.0.0.1")) ?? (await tryPort(0, "127.0.0.1"));
  if (port === null) throw new PlainProblem("No port is free on 127.0.0.1.");
  return port;
}
