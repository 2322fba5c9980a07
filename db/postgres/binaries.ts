// Where PostgreSQL's own programs are. Debian keeps them out of PATH, one folder for each major version.
import { existsSync, readdirSync } from "node:fs";
import { join } from "node:path";
import { PostgresProblem } from "./problem.ts";

const ROOT = "/usr/lib/postgresql";

function installedVersions(): number[] {
  if (!existsSync(ROOT)) return [];
  return readdirSync(ROOT)
    .filter((name) => existsSync(join(ROOT, name, "bin/initdb")))
    .map(Number)
    .sort((a, b) => b - a);
}

/** The folder of the programs that can read a cluster of `version`; the newest when there is no cluster yet. */
export function findBinaries(version: string | null): string {
  if (process.env.PG_BIN) return process.env.PG_BIN;
  const versions = installedVersions();
  const chosen = version === null ? versions[0] : versions.find((installed) => String(installed) === version);
  if (chosen === undefined) {
    const name = version === null ? "postgresql" : `postgresql-${version}`;
    const why = version === null ? "" : ` (the data on this machine were written by version ${version})`;
    throw new PostgresProblem(
      `The PostgreSQL server is not installed${why}: apt-get install -y --no-install-recommends ${name}`,
    );
  }
  return join(ROOT, String(chosen), "bin");
}
