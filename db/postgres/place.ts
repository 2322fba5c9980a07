// Where a cluster lives. Beside the checkout's other data when the account that runs PostgreSQL can enter there.
import { createHash } from "node:crypto";
import {
  chmodSync,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  realpathSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { type Account, accountFor, give, runAs } from "./account.ts";
import { PostgresProblem } from "./problem.ts";

/** `folder` holds `data` (the cluster's) and the superuser's password, which is for the owner of the checkout alone. */
export type Place = { readonly folder: string; readonly account: Account };

async function canEnter(folder: string, account: Account): Promise<boolean> {
  mkdirSync(folder, { recursive: true, mode: 0o755 });
  const trial = mkdtempSync(join(folder, "trial-"));
  give(trial, account);
  const { status } = await runAs(account, ["test", "-w", trial]);
  rmSync(trial, { recursive: true });
  return status === 0;
}

/** PostgreSQL's user cannot enter a checkout under /root or a private home: then the place is named by its path. */
function placeOutside(checkout: string): string {
  const hash = createHash("sha256").update(realpathSync(checkout)).digest("hex").slice(0, 10);
  return `/var/lib/postgresql/linkwright-${hash}`;
}

/** The cluster of a checkout: where it already is, or the first place that can be entered. */
export async function choosePlace(checkout: string, wanted: string): Promise<Place> {
  const candidates = process.getuid?.() === 0 ? [wanted, placeOutside(checkout)] : [wanted];
  const existing = candidates.find((folder) => existsSync(join(folder, "data/PG_VERSION")));
  if (existing) return { folder: existing, account: accountFor(join(existing, "data")) };
  const account = accountFor(join(wanted, "data"));
  for (const folder of candidates) {
    if (await canEnter(folder, account)) return { folder, account };
    rmSync(folder, { recursive: true }); // nothing but an unfinished start can be in it
  }
  throw new PostgresProblem(
    `The user who runs PostgreSQL (${account.uid}) can write in none of ${candidates.join(", ")}: allow it to enter one.`,
  );
}

const TEMPORARY = "linkwright-test-";

function sweepAbandoned(parent: string): void {
  for (const name of readdirSync(parent).filter((entry) => entry.startsWith(TEMPORARY))) {
    const folder = join(parent, name);
    const holder = join(folder, "holder");
    if (!existsSync(holder) || existsSync(`/proc/${readFileSync(holder, "utf8")}`)) continue;
    rmSync(folder, { recursive: true, force: true });
  }
}

/** A folder for one test run that nobody else uses. What runs ended by kill -9 have left is swept away first. */
export function temporaryPlace(): Place {
  const parent = tmpdir();
  try {
    sweepAbandoned(parent);
  } catch {
    // Another user's leftovers are theirs to remove, and another run may be sweeping at this moment.
  }
  const folder = mkdtempSync(join(parent, TEMPORARY));
  chmodSync(folder, 0o755);
  writeFileSync(join(folder, "holder"), String(process.pid));
  const account = accountFor(join(folder, "data"));
  return { folder, account };
}
