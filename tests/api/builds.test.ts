import { randomUUID } from "node:crypto";
import { buildRoutes, studyRoutes, workshopRoutes } from "@linkwright/contract";
import { beforeAll, describe, expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import { buildShop, type Shop } from "./support/shop.ts";
import { buildStudy } from "./support/work.ts";

const api = serveApi();
let shop: Shop;

beforeAll(async () => {
  shop = await buildShop(api());
});

const create = (body: { id: string; name: string; summary?: string }) =>
  shop.members.engineer.client.call(buildRoutes.create, { workshopId: shop.id }, body);

describe("builds", () => {
  test("are made, read by all and renamed", async () => {
    const id = randomUUID();
    const made = await create({ id, name: "  Kit  ", summary: "Two lines\nof it" });
    expect(made).toMatchObject({ id, name: "Kit", summary: "Two lines\nof it", studyCount: 0 });
    const params = { workshopId: shop.id, buildId: id };
    expect(await shop.members.reviewer.client.call(buildRoutes.get, params)).toEqual(made);
    const renamed = await shop.members.owner.client.call(buildRoutes.rename, params, { name: "Kit B" });
    expect(renamed).toMatchObject({ name: "Kit B", summary: "Two lines\nof it", createdAt: made.createdAt });
  });

  test("are listed with the number of their studies, the newest first", async () => {
    const { buildId } = await buildStudy(shop);
    const { builds } = await shop.members.fabricator.client.call(buildRoutes.list, { workshopId: shop.id });
    expect(builds[0]).toMatchObject({ id: buildId, studyCount: 1 });
    const times = builds.map(({ createdAt }) => createdAt);
    expect(times).toEqual([...times].sort().reverse());
  });

  test("sent again are there once, as they are by now", async () => {
    const body = { id: randomUUID(), name: "Once" };
    await create(body);
    await shop.members.engineer.client.call(
      buildRoutes.rename,
      { workshopId: shop.id, buildId: body.id },
      { name: "Renamed" },
    );
    expect(await create(body)).toMatchObject({ id: body.id, name: "Renamed" });
  });

  test("another person's id is not taken over", async () => {
    const body = { id: randomUUID(), name: "Mine" };
    await create(body);
    const problem = await shop.members.owner.client.refused(
      buildRoutes.create,
      { workshopId: shop.id },
      body,
    );
    expect(problem.code).toBe("id_reused");
  });

  test("of two workshops may have the same id and never meet", async () => {
    const other = await buildShop(api());
    const id = randomUUID();
    await create({ id, name: "Ours" });
    const theirs = await other.members.engineer.client.call(
      buildRoutes.create,
      { workshopId: other.id },
      { id, name: "Theirs" },
    );
    expect(theirs.name).toBe("Theirs");
    const ours = await shop.members.engineer.client.call(buildRoutes.get, {
      workshopId: shop.id,
      buildId: id,
    });
    expect(ours.name).toBe("Ours");
  });

  test("that are not there are not found, nor are their studies", async () => {
    const params = { workshopId: shop.id, buildId: randomUUID() };
    const { client } = shop.members.engineer;
    expect((await client.refused(buildRoutes.get, params)).code).toBe("not_found");
    expect((await client.refused(buildRoutes.rename, params, { name: "X" })).code).toBe("not_found");
    expect((await client.refused(studyRoutes.list, params)).code).toBe("not_found");
  });
});

test("members are listed with their roles", async () => {
  const { members } = await shop.members.reviewer.client.call(workshopRoutes.members, {
    workshopId: shop.id,
  });
  expect(members.map(({ name, role }) => [name, role])).toEqual([
    ["The engineer", "engineer"],
    ["The fabricator", "fabricator"],
    ["The owner", "owner"],
    ["The reviewer", "reviewer"],
  ]);
});
