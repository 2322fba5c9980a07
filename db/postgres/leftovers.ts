// What a cluster that was not stopped in order has left in its folder: a lock file, perhaps a server that still runs.
import { readFileSync, readlinkSync, rmSync } from "node:fs";
import { join } from "node:path";

const STOP_TIMEOUT_MS = 20_000;
const POLL_MS = 50;

function readServerPid(data: string): number | null {
  try {
    const pid = Number(readFileSync(join(data, "postmaster.pid"), "utf8").split("\n")[0]);
    return Number.isInteger(pid) && pid > 0 ? pid : null;
  } catch {
    return null;
  }
}

/** Whether the process is the server of these data. A number alone proves nothing: the kernel uses numbers again. */
function serves(pid: number, data: string): boolean {
  try {
    return readlinkSync(`/proc/${pid}/cwd`) === data;
  } catch {
    return false;
  }
}

export function delay(milliseconds: number): Promise<void> {
  return new Promise((resolve) => setTimeout(resolve, milliseconds));
}

async function stopServer(pid: number, data: string): Promise<void> {
  process.kill(pid, "SIGINT"); // PostgreSQL's fast stop: open transactions are rolled back, nothing is lost
  const until = performance.now() + STOP_TIMEOUT_MS;
  while (serves(pid, data)) {
    if (performance.now() > until) process.kill(pid, "SIGQUIT");
    await delay(POLL_MS);
  }
}

/** Clears the way for a new server on `data`; what had to be done is returned in words, null when nothing had to be. */
export async function clearLeftovers(data: string): Promise<string | null> {
  const pid = readServerPid(data);
  if (pid === null) return null;
  if (serves(pid, data)) {
    await stopServer(pid, data);
    return `a database server left running by an earlier start (process ${pid}) was stopped first`;
  }
  rmSync(join(data, "postmaster.pid"), { force: true });
  return "the database had not been stopped in order; its stale lock file was cleared and it recovers by itself";
}
