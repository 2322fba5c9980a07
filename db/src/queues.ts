// The job queues of pg-boss. They are made when migrating, by the owner: making one creates tables, and the role of
// server and worker may not.

import PgBoss from "pg-boss";

export const JOB_SCHEMA = "pgboss";

export const QUEUES = {
  /** Makes a sheet from a revision. */
  makeSheet: "make-sheet",
} as const;

export const SHEET_RETRIES = 4;

/** Creates or updates pg-boss's own tables and our queues, and lets the application's role use them. */
export async function migrateQueues(ownerUrl: string): Promise<void> {
  const boss = new PgBoss({
    connectionString: ownerUrl,
    schema: JOB_SCHEMA,
    supervise: false,
    schedule: false,
    max: 2,
  });
  const failures: unknown[] = [];
  boss.on("error", (error) => failures.push(error));
  await boss.start();
  try {
    await boss.createQueue(QUEUES.makeSheet, {
      name: QUEUES.makeSheet,
      retryLimit: SHEET_RETRIES,
      retryDelay: 2,
      retryBackoff: true,
      expireInSeconds: 120,
    });
    for (const statement of GRANTS) await boss.getDb().executeSql(statement, []);
  } finally {
    await boss.stop({ graceful: false });
  }
  if (failures.length > 0) throw failures[0];
}

const GRANTS = [
  `grant usage on schema ${JOB_SCHEMA} to linkwright_app`,
  `grant select, insert, update, delete on all tables in schema ${JOB_SCHEMA} to linkwright_app`,
];
