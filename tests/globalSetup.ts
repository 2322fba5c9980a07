// Before the API tests: a cluster and a migrated template that every test file copies its own database from.
import { rmSync } from "node:fs";
import { join } from "node:path";
import { migrateDatabase } from "@linkwright/db";
import {
  databaseUrls,
  dropDatabase,
  ensureDatabase,
  makeTemplate,
  startCluster,
  temporaryPlace,
} from "@linkwright/db/postgres";
import type { TestProject } from "vitest/node";

declare module "vitest" {
  interface ProvidedContext {
    databaseAdminUrl: string;
    databaseTemplate: string;
  }
}

/** TEST_DATABASE_ADMIN_URL: the superuser's address of a cluster that holds nothing of value; else one is started. */
async function findCluster(): Promise<{ adminUrl: string; stop: () => Promise<void> }> {
  const given = process.env.TEST_DATABASE_ADMIN_URL;
  if (given) return { adminUrl: given, stop: async () => {} };
  const place = temporaryPlace();
  const cluster = await startCluster(place, { durable: false, log: join(place.folder, "postgres.log") });
  const stop = async () => {
    await cluster.stop();
    rmSync(place.folder, { recursive: true });
  };
  return { adminUrl: cluster.adminUrl, stop };
}

export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const { adminUrl, stop } = await findCluster();
  const template = `linkwright_template_${process.pid}`;
  await ensureDatabase(adminUrl, template);
  await migrateDatabase(databaseUrls(adminUrl, template).owner);
  await makeTemplate(adminUrl, template);
  project.provide("databaseAdminUrl", adminUrl);
  project.provide("databaseTemplate", template);
  return async () => {
    await dropDatabase(adminUrl, template);
    await stop();
  };
}
