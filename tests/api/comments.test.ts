// Comments: on the whole study or on a hardpoint, written by everyone, settled by whom it concerns.

import { randomUUID } from "node:crypto";
import { type CreateCommentRequest, commentRoutes, studyRoutes } from "@linkwright/contract";
import { beforeAll, beforeEach, describe, expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import { buildShop, type Shop } from "./support/shop.ts";
import { type BuildAndStudy, buildStudy, saveRevision } from "./support/work.ts";

const api = serveApi();
let shop: Shop;
let work: BuildAndStudy;

beforeAll(async () => {
  shop = await buildShop(api());
});

beforeEach(async () => {
  work = await buildStudy(shop);
});

type Asked = Partial<CreateCommentRequest>;
const commentRequest = (asked: Asked = {}) => ({
  id: randomUUID(),
  pin: { type: "study" as const },
  text: "Is the bracket there already?",
  ...asked,
});
const write = (role: "owner" | "engineer" | "fabricator" | "reviewer", asked?: Asked) =>
  shop.members[role].client.call(commentRoutes.create, work.params, commentRequest(asked));
const settle = (role: keyof Shop["members"], commentId: string, resolved: boolean) =>
  shop.members[role].client.call(commentRoutes.settle, { workshopId: shop.id, commentId }, { resolved });

describe("writing", () => {
  test("every role may, on the whole study, and all read it in the order it was written", async () => {
    await write("reviewer", { text: "First." });
    await write("fabricator", { text: "Second." });
    await write("engineer", { text: "Third,\nin two lines." });
    const { comments } = await shop.members.reviewer.client.call(commentRoutes.list, work.params);
    expect(comments.map(({ text, createdBy }) => [createdBy.name, text])).toEqual([
      ["The reviewer", "First."],
      ["The fabricator", "Second."],
      ["The engineer", "Third,\nin two lines."],
    ]);
    expect(comments[0]).toMatchObject({
      pin: { type: "study" },
      revision: null,
      resolvedBy: null,
      resolvedAt: null,
    });
  });

  test.each(["left.suspension.lowerArm.frontPivot", "right.tieRod.outer", "left.wheel.centre"])(
    "it may be pinned to the hardpoint %s",
    async (path) => {
      const comment = await write("reviewer", { pin: { type: "hardpoint", path } });
      expect(comment.pin).toEqual({ type: "hardpoint", path });
    },
  );

  test.each(["left.suspension.lowerArm", "left.tieRod.inner.0", "middle.tieRod.inner", "constructor"])(
    "it may not be pinned to %s, which is no hardpoint",
    async (path) => {
      const body = commentRequest({ pin: { type: "hardpoint", path } });
      const { issues } = await shop.members.reviewer.client.refused(commentRoutes.create, work.params, body);
      expect(issues!.map((issue) => issue.path)).toEqual([["pin", "path"]]);
    },
  );

  test("it may speak of a revision that is there, and of no other", async () => {
    await saveRevision(shop, work);
    expect((await write("reviewer", { revision: 1 })).revision).toBe(1);
    const body = commentRequest({ revision: 2 });
    const { issues } = await shop.members.reviewer.client.refused(commentRoutes.create, work.params, body);
    expect(issues!.map(({ path }) => path)).toEqual([["revision"]]);
  });

  test("sent again it is there once; the same id with another text is refused", async () => {
    const body = commentRequest();
    const { client } = shop.members.fabricator;
    const first = await client.call(commentRoutes.create, work.params, body);
    expect(await client.call(commentRoutes.create, work.params, body)).toEqual(first);
    const changed = { ...body, text: "Something else." };
    expect((await client.refused(commentRoutes.create, work.params, changed)).code).toBe("id_reused");
    const { comments } = await client.call(commentRoutes.list, work.params);
    expect(comments.map(({ text }) => text)).toEqual([body.text]);
  });

  test.each([
    ["nothing", "  \n "],
    ["more than 4000 characters", "x".repeat(4001)],
  ])("with %s for a text is refused", async (_name, text) => {
    const { issues } = await shop.members.reviewer.client.refused(
      commentRoutes.create,
      work.params,
      commentRequest({ text }),
    );
    expect(issues!.map(({ path }) => path)).toEqual([["text"]]);
  });

  test("HTML in a text stays text", async () => {
    const text = '<img src=x onerror="alert(1)">';
    expect((await write("reviewer", { text })).text).toBe(text);
  });
});

describe("settling", () => {
  test("whoever wrote it may resolve it and reopen it", async () => {
    const { id } = await write("reviewer");
    const resolved = await settle("reviewer", id, true);
    expect(resolved.resolvedBy).toEqual({ id: shop.members.reviewer.id, name: "The reviewer" });
    expect(Date.parse(resolved.resolvedAt!)).toBeGreaterThanOrEqual(Date.parse(resolved.createdAt));
    const reopened = await settle("reviewer", id, false);
    expect(reopened).toMatchObject({ resolvedBy: null, resolvedAt: null });
  });

  test.each(["engineer", "owner"] as const)("a(n) %s may settle anybody's", async (role) => {
    const { id } = await write("reviewer");
    expect((await settle(role, id, true)).resolvedBy!.id).toBe(shop.members[role].id);
  });

  test.each(["fabricator", "reviewer"] as const)("a %s may not settle another's", async (role) => {
    const { id } = await write("engineer");
    const problem = await shop.members[role].client.refused(
      commentRoutes.settle,
      { workshopId: shop.id, commentId: id },
      { resolved: true },
    );
    expect(problem.code).toBe("not_allowed");
    const { comments } = await shop.members.owner.client.call(commentRoutes.list, work.params);
    expect(comments[0]!.resolvedAt).toBeNull();
  });

  test("a second time changes nothing: the first to resolve it is the one who did", async () => {
    const { id } = await write("reviewer");
    const first = await settle("engineer", id, true);
    expect(await settle("owner", id, true)).toEqual(first);
  });

  test("the study counts what is still open", async () => {
    const { id } = await write("reviewer");
    await write("fabricator");
    const open = async () =>
      (await shop.members.owner.client.call(studyRoutes.get, work.params)).openComments;
    expect(await open()).toBe(2);
    await settle("engineer", id, true);
    expect(await open()).toBe(1);
  });

  test("a comment that is not there is not found", async () => {
    const params = { workshopId: shop.id, commentId: randomUUID() };
    const problem = await shop.members.owner.client.refused(commentRoutes.settle, params, { resolved: true });
    expect(problem.code).toBe("not_found");
  });
});
