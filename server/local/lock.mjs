// A lock file that names its holder. A holder that has died, even by kill -9, does not hold it any longer.
import { readFileSync, unlinkSync, writeFileSync } from "node:fs";
import { PlainProblem } from "./steps.mjs";

/** Ticks since boot at which a process began; with its number this is unique, as numbers alone are used again. */
export function processBegan(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    const afterName = stat.slice(stat.lastIndexOf(")") + 2).split(" ");
    return afterName[0] === "Z" ? null : Number(afterName[19]);
  } catch {
    return null;
  }
}

/** The living holder of the lock, or null when nobody holds it. */
export function readLock(path) {
  try {
    const holder = JSON.parse(readFileSync(path, "utf8"));
    return processBegan(holder.pid) === holder.began && holder.began !== null ? holder : null;
  } catch {
    return null;
  }
}

function tryCreate(path, holder) {
  try {
    writeFileSync(path, JSON.stringify(holder), { flag: "wx" });
    return true;
  } catch (error) {
    if (error.code === "EEXIST") return false;
    throw new PlainProblem(
      `${path} cannot be written (${error.code}): run as the user who owns it, or as root.`,
    );
  }
}

/** Takes the lock or throws what `explain(holder)` says; `stale` tells that a dead holder's file was cleared away. */
export function holdLock(path, explain) {
  const me = { pid: process.pid, began: processBegan(process.pid) };
  let stale = false;
  while (!tryCreate(path, me)) {
    const holder = readLock(path);
    if (holder) throw new PlainProblem(explain(holder));
    stale = true;
    unlinkSync(path);
  }
  const release = () => {
    if (readLock(path)?.pid === process.pid) unlinkSync(path);
  };
  process.once("exit", release);
  return {
    stale,
    /** Adds facts for whoever finds the lock held, such as the address that is served. */
    describe: (facts) => writeFileSync(path, JSON.stringify({ ...me, ...facts })),
    release() {
      process.off("exit", release);
      release();
    },
  };
}
