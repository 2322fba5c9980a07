// Debian's packages the programs stand on: looked for on the disk, installed by apt when they are missing.
import { existsSync, mkdirSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { lastLines, runCommand } from "./commands.mjs";
import { PlainProblem } from "./steps.mjs";

const POSTGRES_ROOT = "/usr/lib/postgresql";
const CLUSTER_SETTINGS = "/etc/postgresql-common/createcluster.d";

function hasPostgres() {
  if (process.env.PG_BIN) return true;
  if (!existsSync(POSTGRES_ROOT)) return false;
  return readdirSync(POSTGRES_ROOT).some((version) => existsSync(join(POSTGRES_ROOT, version, "bin/initdb")));
}

const PRESENT = {
  postgresql: hasPostgres,
  chromium: () => existsSync(process.env.CHROMIUM_PATH ?? "/usr/bin/chromium"),
};

async function findRight(context) {
  if (process.getuid() === 0) return [];
  const sudo = await runCommand("sudo", ["-n", "true"], context).catch(() => ({ code: 1 }));
  return sudo.code === 0 ? ["sudo", "-n"] : null;
}

/**
 * Debian's server package makes and starts a cluster of its own on the usual port unless it is told not to; ours is
 * another one, so that the package is told, for the length of the installation only.
 */
async function withoutDistributionCluster(right, context, work) {
  const file = join(CLUSTER_SETTINGS, "linkwright.conf");
  const line = "create_main_cluster = false\n";
  if (right.length > 0) {
    const script = `mkdir -p ${CLUSTER_SETTINGS} && printf '${line.trim()}\\n' > ${file}`;
    await runCommand("sudo", ["-n", "sh", "-c", script], context);
  } else {
    mkdirSync(CLUSTER_SETTINGS, { recursive: true });
    writeFileSync(file, line);
  }
  try {
    return await work();
  } finally {
    if (right.length > 0) await runCommand("sudo", ["-n", "rm", "-f", file], { ...context, finish: true });
    else rmSync(file, { force: true });
  }
}

async function apt(right, args, context) {
  const [command, ...before] = [
    ...right,
    "env",
    "DEBIAN_FRONTEND=noninteractive",
    "LC_ALL=C.UTF-8",
    "apt-get",
  ];
  const options = ["-y", "-q", "-o", "DPkg::Lock::Timeout=120", "-o", "Dpkg::Options::=--force-confold"];
  const { code, output, log } = await runCommand(command, [...before, ...options, ...args], context);
  context.stop.throwIfAborted();
  if (code === 0) return;
  throw new PlainProblem(
    `apt-get ${args.join(" ")} failed (exit ${code}). Its last lines, the rest is in ${log}:\n${lastLines(output, 8)}`,
  );
}

export function findMissing(names) {
  return names.filter((name) => !PRESENT[name]());
}

export async function ensureDebianPackages(names, context) {
  const missing = findMissing(names);
  if (missing.length === 0) return;
  const install = ["install", "--no-install-recommends", ...missing];
  const right = await findRight(context);
  if (right === null) {
    throw new PlainProblem(
      `${missing.join(" and ")} must be installed, and this user has no right to: run \`apt-get ${install.join(" ")}\` as root once, then start again.`,
    );
  }
  await context.step("Reading Debian's package lists", () => apt(right, ["update"], context));
  await context.step(`Installing ${missing.join(" and ")} from Debian`, async () => {
    await apt(right, [...install, "--download-only"], context);
    await withoutDistributionCluster(right, context, () => apt(right, install, { ...context, finish: true }));
  });
  const still = findMissing(missing);
  if (still.length > 0)
    throw new PlainProblem(`apt-get reports success, yet ${still.join(" and ")} is not there.`);
}
