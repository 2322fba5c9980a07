// Databases and roles inside a cluster. Migrations run as the owner; the programs run as a role that row-level security
// holds for.
import { createHmac } from "node:crypto";
import pg from "pg";

const OWNER = "linkwright_owner";
const APP = "linkwright_app";

/** Runs `work` as the superuser on one connection. */
async function asAdmin<T>(adminUrl: string, work: (client: pg.Client) => Promise<T>): Promise<T> {
  const client = new pg.Client({ connectionString: adminUrl });
  await client.connect();
  try {
    return await work(client);
  } finally {
    await client.end();
  }
}

/** A role's password follows from the superuser's, so that one secret is kept and not three. */
function rolePassword(adminUrl: string, role: string): string {
  return createHmac("sha256", new URL(adminUrl).password).update(role).digest("hex");
}

/** The addresses of a database for the two roles: `owner` for migrations and the seed, `app` for the programs. */
export function databaseUrls(adminUrl: string, database: string): { owner: string; app: string } {
  const urlOf = (role: string) => {
    const url = new URL(adminUrl);
    url.username = role;
    url.password = rolePassword(adminUrl, role);
    url.pathname = `/${database}`;
    return url.href;
  };
  return { owner: urlOf(OWNER), app: urlOf(APP) };
}

export async function ensureRoles(adminUrl: string): Promise<void> {
  await asAdmin(adminUrl, async (client) => {
    for (const role of [OWNER, APP]) {
      const name = client.escapeIdentifier(role);
      const found = await client.query("select 1 from pg_roles where rolname = $1", [role]);
      const verb = found.rowCount === 0 ? "create" : "alter";
      const rights = "login nosuperuser nobypassrls nocreatedb nocreaterole noreplication";
      await client.query(
        `${verb} role ${name} ${rights} password ${client.escapeLiteral(rolePassword(adminUrl, role))}`,
      );
    }
  });
}

async function create(client: pg.Client, database: string, template: string): Promise<void> {
  const name = client.escapeIdentifier(database);
  await client.query(`create database ${name} owner ${OWNER} template ${client.escapeIdentifier(template)}`);
  await client.query(`revoke all on database ${name} from public`);
  await client.query(`grant connect on database ${name} to ${APP}`);
}

/** Makes the database unless it is there. Answers whether it was made. */
export async function ensureDatabase(adminUrl: string, database: string): Promise<boolean> {
  return asAdmin(adminUrl, async (client) => {
    const found = await client.query("select 1 from pg_database where datname = $1", [database]);
    if (found.rowCount !== 0) return false;
    await create(client, database, "template1");
    return true;
  });
}

/** Makes a database with all that `template` holds. */
export async function createDatabase(adminUrl: string, database: string, template: string): Promise<void> {
  await asAdmin(adminUrl, (client) => create(client, database, template));
}

/** From here on nobody can connect to `database`, and copies of it never wait for a connection to end. */
export async function makeTemplate(adminUrl: string, database: string): Promise<void> {
  await asAdmin(adminUrl, async (client) => {
    await client.query(
      `alter database ${client.escapeIdentifier(database)} with is_template true allow_connections false`,
    );
  });
}

/** Removes the database, its connections too. A template is an ordinary database again first. */
export async function dropDatabase(adminUrl: string, database: string): Promise<void> {
  await asAdmin(adminUrl, async (client) => {
    const name = client.escapeIdentifier(database);
    const found = await client.query("select 1 from pg_database where datname = $1", [database]);
    if (found.rowCount === 0) return;
    await client.query(`alter database ${name} with is_template false`);
    await client.query(`drop database ${name} with (force)`);
  });
}
