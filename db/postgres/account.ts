// The account PostgreSQL runs as. It refuses to run as root, so root hands over to another user.
import { execFileSync, spawn } from "node:child_process";
import { chownSync, statSync } from "node:fs";
import { PostgresProblem } from "./problem.ts";

export type Account = { readonly uid: number; readonly gid: number };

function idOf(option: "-u" | "-g"): number {
  return Number(
    execFileSync("id", [option, "postgres"], { encoding: "utf8", stdio: ["ignore", "pipe", "pipe"] }),
  );
}

/** The owner of what is at `path`; as root, Debian's own user for PostgreSQL when there is nothing yet. */
export function accountFor(path: string): Account {
  const me = { uid: process.getuid?.() ?? -1, gid: process.getgid?.() ?? -1 };
  const found = statSync(path, { throwIfNoEntry: false });
  const owner = found && { uid: found.uid, gid: found.gid };
  if (me.uid !== 0) {
    if (!owner || owner.uid === me.uid) return me;
    throw new PostgresProblem(`${path} belongs to another user (${owner.uid}): start as root or with sudo.`);
  }
  if (owner && owner.uid !== 0) return owner;
  try {
    return { uid: idOf("-u"), gid: idOf("-g") };
  } catch {
    throw new PostgresProblem(
      "The user `postgres` is missing: apt-get install -y --no-install-recommends postgresql",
    );
  }
}

/**
 * Puts a command under the account, and under a leash: the kernel sends it `signal` when this process dies, however it
 * dies, so that no server is left behind.
 */
export function underAccount(account: Account, signal: "INT" | "TERM", command: readonly string[]): string[] {
  const change =
    process.getuid?.() === 0 ? [`--reuid=${account.uid}`, `--regid=${account.gid}`, "--clear-groups"] : [];
  return ["setpriv", ...change, "--pdeathsig", signal, "--", ...command];
}

/**
 * Runs a command of the account's to its end, which Ctrl-C at the terminal does not reach. The folder is `/`, as the
 * account need not be able to enter ours.
 */
export function runAs(
  account: Account,
  command: readonly string[],
): Promise<{ status: number; output: string }> {
  const [program, ...args] = underAccount(account, "TERM", command);
  return new Promise((resolve, reject) => {
    const child = spawn(program as string, args, {
      cwd: "/",
      env: serverEnvironment(),
      stdio: ["ignore", "pipe", "pipe"],
      detached: true,
    });
    let output = "";
    for (const stream of [child.stdout, child.stderr]) stream.on("data", (chunk) => (output += chunk));
    child.once("error", reject);
    child.once("close", (code) => resolve({ status: code ?? 1, output }));
  });
}

/** Nothing of the caller's environment: PGDATA, PGPORT and their like would be obeyed. */
export function serverEnvironment(): Record<string, string> {
  return { PATH: "/usr/bin:/bin", LANG: "C.UTF-8", TZ: "UTC" };
}

export function give(path: string, account: Account): void {
  if (process.getuid?.() === 0) chownSync(path, account.uid, account.gid);
}
