// Running the machine's own commands during the set-up, with all they say in a log file.
import { spawn } from "node:child_process";
import { appendFileSync } from "node:fs";
import { join } from "node:path";

/**
 * Runs a command to its end. `finish: true` keeps Ctrl-C away from it: a package manager that is cut off half way
 * leaves the machine with half-installed packages. Without it the command ends when `stop` is raised or this process dies.
 */
export function runCommand(command, args, { root, dataFolder, stop, env = {}, finish = false }) {
  const log = join(dataFolder, "logs", "setup.log");
  appendFileSync(log, `\n$ ${command} ${args.join(" ")}\n`);
  return new Promise((resolve, reject) => {
    const [program, ...rest] = finish
      ? [command, ...args]
      : ["setpriv", "--pdeathsig", "TERM", "--", command, ...args];
    const child = spawn(program, rest, {
      cwd: root,
      env: { ...process.env, ...env },
      stdio: ["ignore", "pipe", "pipe"],
      detached: finish,
    });
    let output = "";
    const keep = (chunk) => {
      output = (output + chunk).slice(-20_000);
      appendFileSync(log, chunk);
    };
    child.stdout.on("data", keep);
    child.stderr.on("data", keep);
    const end = () => {
      if (finish) process.stdout.write("(stopping as soon as this is through) ");
      else child.kill("SIGTERM");
    };
    stop.addEventListener("abort", end, { once: true });
    child.once("error", reject);
    child.once("close", (code) => {
      stop.removeEventListener("abort", end);
      resolve({ code: code ?? 1, output, log });
    });
  });
}

export function lastLines(text, count) {
  return text.trimEnd().split("\n").slice(-count).join("\n");
}
