// The migrations are generated from the schema: whoever changes one and forgets the other is told here.

import { readdirSync, readFileSync } from "node:fs";
import { generateDrizzleJson, generateMigration } from "drizzle-kit/api";
import { expect, test } from "vitest";
import * as schema from "./schema/index.ts";

const META = new URL("../migrations/meta/", import.meta.url);

test("bring a database to exactly what the schema says", async () => {
  const newest = readdirSync(META)
    .filter((name) => name.endsWith("_snapshot.json"))
    .sort()
    .at(-1)!;
  const snapshot = JSON.parse(readFileSync(new URL(newest, META), "utf8"));
  const statements = await generateMigration(snapshot, generateDrizzleJson(schema, snapshot.id));
  expect(statements).toEqual([]);
});
