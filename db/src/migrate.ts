// Brings a database up to date, as its owner. A second run changes nothing.

import { fileURLToPath, pathToFileURL } from "node:url";
import { drizzle } from "drizzle-orm/node-postgres";
import { migrate } from "drizzle-orm/node-postgres/migrator";
import pg from "pg";
import { migrateQueues } from "./queues.ts";

const MIGRATIONS = fileURLToPath(new URL("../migrations", import.meta.url));
/** Any number, the same in every process: two programs that migrate at once take turns. */
const MIGRATION_LOCK = 7_413_905;
const APP_ROLE = "linkwright_app";

export async function migrateDatabase(ownerUrl: string): Promise<void> {
  const client = new pg.Client({ connectionString: ownerUrl, application_name: "linkwright migrate" });
  await client.connect();
  try {
    await client.query("select pg_advisory_lock($1)", [MIGRATION_LOCK]);
    await requireAppRole(client);
    await migrate(drizzle(client), { migrationsFolder: MIGRATIONS });
    await migrateQueues(ownerUrl);
  } finally {
    await client.end();
  }
}

async function requireAppRole(client: pg.Client): Promise<void> {
  const { rows } = await client.query<{ rolsuper: boolean; rolbypassrls: boolean }>(
    "select rolsuper, rolbypassrls from pg_roles where rolname = $1",
    [APP_ROLE],
  );
  const role = rows[0];
  if (!role) {
    throw new Error(
      `The role ${APP_ROLE} is missing. As a superuser: create role ${APP_ROLE} login nosuperuser;`,
    );
  }
  if (role.rolsuper || role.rolbypassrls) {
    throw new Error(
      `The role ${APP_ROLE} passes row-level security. As a superuser: alter role ${APP_ROLE} nosuperuser nobypassrls;`,
    );
  }
}

if (process.argv[1] && import.meta.url === pathToFileURL(process.argv[1]).href) {
  const ownerUrl = process.env.DATABASE_OWNER_URL;
  if (!ownerUrl) {
    console.error("Set DATABASE_OWNER_URL to the address of the database, as its owner.");
    process.exit(2);
  }
  await migrateDatabase(ownerUrl);
}
