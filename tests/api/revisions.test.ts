// Revisions: the whole document as it stood, numbered, hashed, and out of everybody's reach afterwards.

import { createHash, randomUUID } from "node:crypto";
import { revisionRoutes, studyRoutes } from "@linkwright/contract";
import { hashDocument, inWorkshop, revisions } from "@linkwright/db";
import { eq } from "drizzle-orm";
import { beforeAll, beforeEach, describe, expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import type { Client } from "./support/client.ts";
import { asOwner } from "./support/owner.ts";
import { buildShop, type Shop } from "./support/shop.ts";
import { type BuildAndStudy, buildStudy, plainStudy, saveRevision } from "./support/work.ts";

const api = serveApi();
let shop: Shop;
let engineer: Client;
let work: BuildAndStudy;

beforeAll(async () => {
  shop = await buildShop(api());
  engineer = shop.members.engineer.client;
});

beforeEach(async () => {
  work = await buildStudy(shop);
});

describe("saving a revision", () => {
  test("keeps the draft as it stands, with number, note, hash and who", async () => {
    const body = { id: randomUUID(), version: 1, note: "As drawn." };
    const revision = await engineer.call(revisionRoutes.save, work.params, body);
    expect(revision).toEqual({
      number: 1,
      note: "As drawn.",
      status: "saved",
      hash: hashDocument(plainStudy),
      createdBy: { id: shop.members.engineer.id, name: shop.members.engineer.name },
      createdAt: expect.any(String),
      study: plainStudy,
    });
  });

  test("numbers within the study and leaves earlier ones as they were", async () => {
    await saveRevision(shop, work);
    const edit = { path: ["axle", "name"], from: plainStudy.axle.name, to: "Second" };
    await engineer.call(studyRoutes.saveEdits, work.params, {
      id: randomUUID(),
      baseVersion: 1,
      edits: [edit],
    });
    expect(await saveRevision(shop, work)).toBe(2);
    const other = await buildStudy(shop);
    expect(await saveRevision(shop, other)).toBe(1);
    const { reviewer } = shop.members;
    const first = await reviewer.client.call(revisionRoutes.get, { ...work.params, number: 1 });
    const second = await reviewer.client.call(revisionRoutes.get, { ...work.params, number: 2 });
    expect(first.study).toEqual(plainStudy);
    expect(second.study.axle.name).toBe("Second");
    expect(second.hash).not.toBe(first.hash);
    const { revisions } = await reviewer.client.call(revisionRoutes.list, work.params);
    expect(revisions.map(({ number }) => number)).toEqual([2, 1]);
  });

  test("of a draft that has moved on is refused, so that nobody saves what they have not seen", async () => {
    const edit = { path: ["axle", "name"], from: plainStudy.axle.name, to: "Moved" };
    await engineer.call(studyRoutes.saveEdits, work.params, {
      id: randomUUID(),
      baseVersion: 1,
      edits: [edit],
    });
    const problem = await engineer.refused(revisionRoutes.save, work.params, {
      id: randomUUID(),
      version: 1,
    });
    expect(problem.code).toBe("draft_moved");
    expect((await engineer.call(revisionRoutes.list, work.params)).revisions).toEqual([]);
  });

  test("sent again makes one revision; the same id for another one is refused", async () => {
    const body = { id: randomUUID(), version: 1, note: "once" };
    const [first, again] = await Promise.all([
      engineer.call(revisionRoutes.save, work.params, body),
      engineer.call(revisionRoutes.save, work.params, body),
    ]);
    expect(again).toEqual(first);
    expect((await engineer.call(revisionRoutes.list, work.params)).revisions).toHaveLength(1);
    const other = await engineer.refused(revisionRoutes.save, work.params, { ...body, note: "twice" });
    expect(other.code).toBe("id_reused");
  });

  test("many at once get a number each", async () => {
    const numbers = await Promise.all([1, 2, 3, 4, 5].map(() => saveRevision(shop, work)));
    expect(numbers.sort()).toEqual([1, 2, 3, 4, 5]);
  });
});

describe("the hash", () => {
  test("is SHA-256 over the canonical JSON of RFC 8785, whatever the order of keys", () => {
    // The RFC's own example of section 3.2.2 and 3.2.3, with the octets it prints.
    const document = JSON.parse(
      '{"numbers":[333333333.33333329,1E30,4.50,2e-3,0.000000000000000000000000001],' +
        '"string":"\\u20ac$\\u000F\\u000aA\'\\u0042\\u0022\\u005c\\\\\\"\\/","literals":[null,true,false]}',
    );
    const canonical =
      '{"literals":[null,true,false],"numbers":[333333333.3333333,1e+30,4.5,0.002,1e-27],' +
      '"string":"€$\\u000f\\nA\'B\\"\\\\\\\\\\"/"}';
    expect(hashDocument(document)).toBe(createHash("sha256").update(canonical, "utf8").digest("hex"));
    const { axle, ...rest } = plainStudy;
    expect(hashDocument({ ...rest, axle })).toBe(hashDocument(plainStudy));
  });

  test("of what comes back is the hash that was kept: the database alters no number", async () => {
    const awkward = {
      ...plainStudy,
      rideHeights: [{ name: "Odd", wheelUp: 0.1 + 0.2, rakeDeg: 1e-7, band: [-1 / 3, 40] as const }],
    };
    const odd = await buildStudy(shop, awkward);
    await saveRevision(shop, odd);
    const revision = await engineer.call(revisionRoutes.get, { ...odd.params, number: 1 });
    expect(revision.study).toEqual(awkward);
    expect(hashDocument(revision.study)).toBe(revision.hash);
  });
});

describe("in the database itself a revision", () => {
  beforeEach(() => saveRevision(shop, work));

  const changes: readonly (readonly [string, string])[] = [
    ["content", "update revisions set study = study || '{\"targets\": []}'"],
    ["hash", "update revisions set hash = repeat('0', 64)"],
    ["note", "update revisions set note = 'other'"],
    ["number", "update revisions set number = number + 10"],
    ["row", "delete from revisions"],
    ["table", "truncate revisions cascade"],
  ];

  test.each(changes)(
    "does not let its %s be touched, not even by the owner of the tables",
    async (_name, sql) => {
      await expect(asOwner(api(), sql)).rejects.toThrow("a revision is never changed or removed");
    },
  );

  test("lets its status be changed: that is what review is for", async () => {
    await asOwner(api(), "update revisions set status = 'inReview' where study_id = $1", [work.studyId]);
    const revision = await engineer.call(revisionRoutes.get, { ...work.params, number: 1 });
    expect(revision.status).toBe("inReview");
  });

  test("gives the programs no right to change or remove it", async () => {
    const attempt = (sql: "update" | "delete") =>
      inWorkshop(api().connection.db, shop.id, async ({ tx }) => {
        const own = eq(revisions.studyId, work.studyId);
        if (sql === "update") await tx.update(revisions).set({ note: "other" }).where(own);
        else await tx.delete(revisions).where(own);
      });
    for (const sql of ["update", "delete"] as const) {
      await expect(attempt(sql)).rejects.toMatchObject({ cause: { code: "42501" } });
    }
  });
});
