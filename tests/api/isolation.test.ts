// The second wall between workshops: row-level security in PostgreSQL, for the query that forgets its `where`.

import { randomUUID } from "node:crypto";
import { commentRoutes, sheetRoutes, studyRoutes } from "@linkwright/contract";
import {
  asPerson,
  builds,
  comments,
  draftEdits,
  inWorkshop,
  memberships,
  revisions,
  sheets,
  studies,
  type Tx,
  workshops,
} from "@linkwright/db";
import { eq, getTableName, sql } from "drizzle-orm";
import { beforeAll, describe, expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import { asOwner } from "./support/owner.ts";
import { buildShop, type Shop } from "./support/shop.ts";
import { buildStudy, plainStudy, saveRevision } from "./support/work.ts";

const api = serveApi();
let ours: Shop;
let theirs: Shop;

const TENANT_TABLES = [builds, studies, draftEdits, revisions, comments, sheets, memberships] as const;

/** A row in every table. */
async function fill(shop: Shop): Promise<void> {
  const { client } = shop.members.engineer;
  const work = await buildStudy(shop);
  await saveRevision(shop, work);
  const edit = { path: ["axle", "name"], from: plainStudy.axle.name, to: shop.name };
  await client.call(studyRoutes.saveEdits, work.params, { id: randomUUID(), baseVersion: 1, edits: [edit] });
  await client.call(commentRoutes.create, work.params, {
    id: randomUUID(),
    pin: { type: "study" },
    text: "Ours.",
  });
  const sheet = { id: randomUUID(), revision: 1, kind: "hardpointTable", units: "mm" } as const;
  await client.call(sheetRoutes.create, work.params, sheet);
}

beforeAll(async () => {
  ours = await buildShop(api(), "Ours");
  theirs = await buildShop(api(), "Theirs");
  await fill(ours);
  await fill(theirs);
});

const inOurs = <T>(work: (tx: Tx) => Promise<T>) =>
  inWorkshop(api().connection.db, ours.id, ({ tx }) => work(tx));

test("every table that names a workshop is held to it", async () => {
  const rows = await asOwner(
    api(),
    `select c.relname as name, c.relrowsecurity as held from pg_class c
     join pg_attribute a on a.attrelid = c.oid and a.attname = 'workshop_id'
     where c.relkind = 'r' and c.relnamespace = 'public'::regnamespace order by 1`,
  );
  const expected = TENANT_TABLES.map((table) => ({ name: getTableName(table), held: true }));
  expect(rows).toEqual(expected.sort((a, b) => (a.name < b.name ? -1 : 1)));
});

test("the programs' role can pass no policy and owns nothing", async () => {
  const rows = await asOwner(
    api(),
    `select rolsuper, rolbypassrls, rolcreaterole, rolcreatedb,
       (select count(*)::int from pg_class where relowner = r.oid) as owned
     from pg_roles r where rolname = 'linkwright_app'`,
  );
  expect(rows).toEqual([
    { rolsuper: false, rolbypassrls: false, rolcreaterole: false, rolcreatedb: false, owned: 0 },
  ]);
});

describe.each(TENANT_TABLES.map((table) => [getTableName(table), table] as const))(
  "a query on %s",
  (_name, table) => {
    test("without a where sees the rows of its own workshop and no others", async () => {
      const rows = await inOurs((tx) => tx.select({ workshopId: table.workshopId }).from(table));
      expect(rows.length).toBeGreaterThan(0);
      expect(new Set(rows.map(({ workshopId }) => workshopId))).toEqual(new Set([ours.id]));
    });

    test("outside of any workshop sees nothing", async () => {
      expect(await api().connection.db.select({ workshopId: table.workshopId }).from(table)).toEqual([]);
    });
  },
);

describe("a statement that changes rows", () => {
  test("without a where changes those of its own workshop only", async () => {
    await inOurs((tx) => tx.update(builds).set({ summary: "touched" }));
    const rows = await asOwner(api(), "select workshop_id as id, summary from builds");
    for (const row of rows as { id: string; summary: string }[]) {
      expect(row.summary === "touched").toBe(row.id === ours.id);
    }
  });

  test("cannot write a row into another workshop", async () => {
    const row = {
      id: randomUUID(),
      workshopId: theirs.id,
      name: "Smuggled",
      createdBy: ours.members.owner.id,
    };
    await expect(inOurs((tx) => tx.insert(builds).values(row))).rejects.toMatchObject({
      cause: { code: "42501" },
    });
  });

  test("cannot move a row into another workshop", async () => {
    const move = inOurs((tx) => tx.update(comments).set({ workshopId: theirs.id }));
    await expect(move).rejects.toMatchObject({ cause: { code: "42501" } });
  });

  test("cannot hang a row of one workshop on a row of another: the keys hold both", async () => {
    const [study] = (await asOwner(api(), "select id from studies where workshop_id = $1", [theirs.id])) as {
      id: string;
    }[];
    const row = {
      id: randomUUID(),
      workshopId: ours.id,
      studyId: study!.id,
      pin: "study" as const,
      text: "Across the wall.",
      createdBy: ours.members.owner.id,
    };
    await expect(inOurs((tx) => tx.insert(comments).values(row))).rejects.toMatchObject({
      cause: { code: "23503", constraint: "comments_study" },
    });
  });

  test("cannot give anybody a membership elsewhere", async () => {
    const row = { workshopId: theirs.id, personId: ours.members.owner.id, role: "owner" as const };
    const attempt = inOurs((tx) => tx.insert(memberships).values(row));
    await expect(attempt).rejects.toMatchObject({ cause: { code: "42501" } });
  });
});

describe("a person", () => {
  test("sees their own memberships and workshops before one is chosen, and no others", async () => {
    const { id: personId } = ours.members.engineer;
    const seen = await asPerson(api().connection.db, personId, async ({ tx }) => ({
      memberships: await tx.select({ workshopId: memberships.workshopId }).from(memberships),
      workshops: await tx.select({ id: workshops.id }).from(workshops),
      builds: await tx.select({ id: builds.id }).from(builds),
    }));
    expect(seen).toEqual({
      memberships: [{ workshopId: ours.id }],
      workshops: [{ id: ours.id }],
      builds: [],
    });
  });
});

test("the workshop that was set ends with its transaction", async () => {
  await inOurs((tx) => tx.select().from(builds));
  const { rows } = await api().connection.db.execute(
    sql`select coalesce(current_setting('linkwright.workshop_id', true), '') as left_over`,
  );
  expect(rows).toEqual([{ left_over: "" }]);
  await expect(
    inOurs(async (tx) => {
      await tx.update(workshops).set({ name: "Undone" }).where(eq(workshops.id, ours.id));
      throw new Error("changed my mind");
    }),
  ).rejects.toThrow("changed my mind");
  expect(await inOurs((tx) => tx.select({ name: workshops.name }).from(workshops))).toEqual([
    { name: "Ours" },
  ]);
});
