// A database of its own for each API test file, copied from the migrated template.
import { randomUUID } from "node:crypto";
import { createDatabase, databaseUrls, dropDatabase } from "@linkwright/db/postgres";
import { inject } from "vitest";

export type TestDatabase = {
  /** As the programs connect: row-level security holds. */
  readonly appUrl: string;
  /** As migrations connect: owns every table. */
  readonly ownerUrl: string;
  drop(): Promise<void>;
};

export async function createTestDatabase(): Promise<TestDatabase> {
  const adminUrl = inject("databaseAdminUrl");
  const name = `test_${randomUUID().replaceAll("-", "")}`;
  await createDatabase(adminUrl, name, inject("databaseTemplate"));
  const { owner, app } = databaseUrls(adminUrl, name);
  return { appUrl: app, ownerUrl: owner, drop: () => dropDatabase(adminUrl, name) };
}
