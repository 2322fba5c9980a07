// What every request is held to before any feature sees it: where it comes from, and what it is made of.

import { randomUUID } from "node:crypto";
import { authRoutes, buildRoutes, CSRF_HEADER, pathTo, studyRoutes } from "@linkwright/contract";
import { beforeAll, describe, expect, test } from "vitest";
import { PUBLIC_URL, serveApi } from "./support/api.ts";
import { createClient, problemOf, type SendOptions } from "./support/client.ts";
import { asOwner } from "./support/owner.ts";
import { buildShop, type Shop } from "./support/shop.ts";
import { buildStudy, plainStudy } from "./support/work.ts";

const api = serveApi();
let shop: Shop;

beforeAll(async () => {
  shop = await buildShop(api());
});

function createBuild(options: SendOptions) {
  const path = pathTo(buildRoutes.create, { workshopId: shop.id });
  return shop.members.engineer.client.send("POST", path, options);
}

const goodBody = () => ({ id: randomUUID(), name: "A kit" });

describe("a request that changes something", () => {
  test.each([
    ["without our own header", { [CSRF_HEADER]: undefined }],
    ["from another origin", { Origin: "https://elsewhere.example" }],
    ["from another port of the same host", { Origin: "http://linkwright.test:8080" }],
    ["from a page without an origin", { Origin: "null" }],
    ["that the browser calls cross-site", { "Sec-Fetch-Site": "cross-site" }],
    ["that the browser calls same-site", { "Sec-Fetch-Site": "same-site" }],
  ])("%s is refused", async (_name, headers) => {
    const reply = await createBuild({ body: goodBody(), headers });
    expect(problemOf(reply).code).toBe("foreign_request");
  });

  test.each([
    ["our own address", { Origin: PUBLIC_URL, "Sec-Fetch-Site": "same-origin" }],
    ["the host it was sent to, as in development", { Origin: () => api().url }],
    ["a program, which sends no origin", { Origin: undefined }],
  ])("from %s is taken", async (_name, headers) => {
    const sent = Object.entries(headers).map(([name, value]) => [
      name,
      typeof value === "function" ? value() : value,
    ]);
    expect((await createBuild({ body: goodBody(), headers: Object.fromEntries(sent) })).status).toBe(201);
  });

  test("a form of another site, with the cookie and a form's own media type, gets nowhere", async () => {
    const body = `id=${randomUUID()}&name=Planted`;
    const headers = {
      "Content-Type": "application/x-www-form-urlencoded",
      [CSRF_HEADER]: undefined,
      Origin: undefined,
    };
    expect(problemOf(await createBuild({ body, headers })).code).toBe("foreign_request");
  });
});

describe("a body", () => {
  test.each([
    ["that is not JSON", "{ not json", "invalid"],
    ["that is a bare string", '"text"', "invalid"],
    ["that is null", "null", "invalid"],
    ["that is larger than a megabyte", JSON.stringify({ name: "x".repeat(1_100_000) }), "too_large"],
    ["that is nested without end", "[".repeat(5000) + "]".repeat(5000), "invalid"],
  ])("%s is refused", async (_name, body, code) => {
    expect(problemOf(await createBuild({ body })).code).toBe(code);
  });

  test("that is missing is refused with what is required", async () => {
    const problem = problemOf(await createBuild({}));
    expect(problem.code).toBe("invalid");
  });

  test.each([
    ["NUL", "with \u0000 inside"],
    ["half a surrogate pair", "broken \ud83d here"],
  ])("with %s in a string is refused where it stands", async (_name, name) => {
    const problem = problemOf(await createBuild({ body: { ...goodBody(), name } }));
    expect(problem.issues).toHaveLength(1);
    expect(problem.issues![0]!.path).toEqual(["name"]);
  });

  test("with a member that is not known is refused, not trimmed: nothing can be assigned by surprise", async () => {
    const problem = problemOf(await createBuild({ body: { ...goodBody(), workshopId: randomUUID() } }));
    expect(problem.issues!.map(({ path }) => path)).toEqual([["workshopId"]]);
  });

  test("with __proto__ is refused like any other unknown member", async () => {
    const body = `{"id":"${randomUUID()}","name":"A kit","__proto__":{"isAdmin":true}}`;
    expect(problemOf(await createBuild({ body })).issues!.map(({ path }) => path)).toEqual([["__proto__"]]);
  });

  test.each([
    ["an id that is none", { id: "12" }, ["id"]],
    ["a name of blanks", { name: "   " }, ["name"]],
    ["a name that is too long", { name: "x".repeat(121) }, ["name"]],
    ["a name of two lines", { name: "one\r\ntwo" }, ["name"]],
    ["a number for a name", { name: 7 }, ["name"]],
  ])("with %s is refused with its path", async (_name, change, path) => {
    const problem = problemOf(await createBuild({ body: { ...goodBody(), ...change } }));
    expect(problem.issues!.map((issue) => issue.path)).toEqual([path]);
    expect(problem.issues![0]!.hint).not.toBe("");
  });

  test.each([
    "'; drop table builds; --",
    "../../etc/passwd",
    "<script>alert(1)</script>",
    "{{7*7}}",
    "%00",
    "ﷺ 👩‍🔧 Žluťoučký",
  ])("may name a build %s, and gets it back as it was", async (name) => {
    const reply = await createBuild({ body: { ...goodBody(), name } });
    expect(reply.json).toMatchObject({ name });
  });
});

describe("a path", () => {
  test.each([
    "/api/workshops/not-an-id/builds",
    "/api/workshops/%00/builds",
    "/api/workshops/%E0%A4%A/builds",
    "/api/workshops/../builds",
    "/api/nowhere",
    "/api",
  ])("%s leads nowhere, as a problem", async (path) => {
    const reply = await shop.members.engineer.client.send("GET", path);
    expect(problemOf(reply).code).toBe("not_found");
  });

  test.each(["0", "-1", "1.5", "1e3", "99999999999", "one"])(
    "with the revision number %s leads nowhere",
    async (number) => {
      const { params } = await buildStudy(shop);
      const path = `/api/workshops/${shop.id}/studies/${params.studyId}/revisions/${number}`;
      expect(problemOf(await shop.members.engineer.client.send("GET", path)).code).toBe("not_found");
    },
  );
});

describe("an answer", () => {
  test("is never kept by caches, is never sniffed, and bears its request id", async () => {
    const reply = await shop.members.owner.client.send("GET", authRoutes.me.path);
    expect(reply.headers.get("cache-control")).toBe("no-store");
    expect(reply.headers.get("x-content-type-options")).toBe("nosniff");
    expect(reply.headers.get("x-request-id")).toMatch(/^[0-9a-f-]{36}$/);
    expect(reply.headers.get("x-powered-by")).toBeNull();
  });

  test("of a fault of ours says nothing about it, and the log knows it by the same id", async () => {
    const { params } = await buildStudy(shop);
    const path = pathTo(studyRoutes.get, params);
    // A document that does not fit its schema is what a fault in a migration would leave.
    await asOwner(api(), "update studies set draft = draft - 'axle' where id = $1", [params.studyId]);
    const problem = problemOf(await shop.members.owner.client.send("GET", path));
    expect(problem.code).toBe("internal");
    expect(JSON.stringify(problem)).not.toMatch(/schema|zod|select/i);
    const line = api().logged.find((entry) => entry.includes(problem.requestId));
    expect(line).toContain("does not fit its schema");
  });
});

test("what a person typed into a study's names comes back as it was", async () => {
  const name = `Kit "No. 7" — <b>it's</b> 100% ${"é".normalize("NFD")}`;
  const { params } = await buildStudy(shop, { ...plainStudy, axle: { ...plainStudy.axle, name } });
  const { draft } = await shop.members.reviewer.client.call(studyRoutes.get, params);
  expect(draft.axle.name).toBe(name);
  expect(await createClient(api().url).refused(studyRoutes.get, params)).toMatchObject({
    code: "not_signed_in",
  });
});
