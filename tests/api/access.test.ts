// Every route of the API, tried as nobody, as each role and as a stranger from another workshop, with real ids.

import { randomUUID } from "node:crypto";
import {
  API_ROUTES,
  apiRoutes,
  commentRoutes,
  may,
  pathTo,
  type Role,
  type Route,
  sheetRoutes,
} from "@linkwright/contract";
import { beforeAll, describe, expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import { type Client, createClient, problemOf, type Reply } from "./support/client.ts";
import { buildShop, type Shop } from "./support/shop.ts";
import { type BuildAndStudy, buildStudy, plainStudy, saveRevision } from "./support/work.ts";

const api = serveApi();

interface House {
  readonly shop: Shop;
  readonly stranger: Client;
  readonly work: BuildAndStudy;
  readonly commentId: string;
  readonly sheetId: string;
}

let house: House;

beforeAll(async () => {
  const shop = await buildShop(api(), "Home");
  const elsewhere = await buildShop(api(), "Elsewhere");
  const work = await buildStudy(shop);
  await saveRevision(shop, work);
  const [commentId, sheetId] = [randomUUID(), randomUUID()];
  const { owner } = shop.members;
  await owner.client.call(commentRoutes.create, work.params, {
    id: commentId,
    pin: { type: "study" },
    text: "Why?",
  });
  await owner.client.call(sheetRoutes.create, work.params, {
    id: sheetId,
    revision: 1,
    kind: "hardpointTable",
    units: "mm",
  });
  house = { shop, stranger: elsewhere.members.owner.client, work, commentId, sheetId };
});

/** What a good request to each route carries. A route without a row here fails the first test below. */
const { auth, workshops, builds, studies, revisions, comments, sheets } = apiRoutes;
const BODIES: ReadonlyMap<Route, () => unknown> = new Map<Route, () => unknown>([
  [auth.signUp, () => signUpBody()],
  [auth.signIn, () => ({ email: "nobody@example.org", password: "not the right one" })],
  [auth.signOut, () => undefined],
  [auth.me, () => undefined],
  [auth.changeMe, () => ({ units: "inch" })],
  [workshops.members, () => undefined],
  [builds.list, () => undefined],
  [builds.create, () => ({ id: randomUUID(), name: "Another kit" })],
  [builds.get, () => undefined],
  [builds.rename, () => ({ name: "Renamed kit" })],
  [studies.list, () => undefined],
  [
    studies.create,
    () => ({ id: randomUUID(), name: "Another study", source: { type: "document", study: plainStudy } }),
  ],
  [studies.get, () => undefined],
  [studies.rename, () => ({ name: "Renamed study" })],
  [studies.saveEdits, () => ({ id: randomUUID(), baseVersion: 1, edits: [nameEdit()] })],
  [revisions.list, () => undefined],
  [revisions.save, () => ({ id: randomUUID(), version: 1 })],
  [revisions.get, () => undefined],
  [comments.list, () => undefined],
  [comments.create, () => ({ id: randomUUID(), pin: { type: "study" }, text: "Because." })],
  [comments.settle, () => ({ resolved: true })],
  [sheets.list, () => undefined],
  [sheets.create, () => ({ id: randomUUID(), revision: 1, kind: "hardpointTable", units: "inch" })],
  [sheets.get, () => undefined],
  [sheets.download, () => undefined],
]);

/** What a request that got past the guards may still be answered with here. */
const OUTCOMES: ReadonlyMap<Route, readonly number[]> = new Map<Route, readonly number[]>([
  [auth.signIn, [401]], // wrong credentials
  [studies.saveEdits, [200, 409]], // another role has saved first
  [revisions.save, [201, 409]],
  [comments.settle, [200, 403]], // another's comment: the role may comment, and yet not settle it
  [sheets.download, [409]], // no worker runs here, so it is not made
]);

function signUpBody() {
  const [personId, workshopId] = [randomUUID(), randomUUID()];
  return {
    personId,
    workshopId,
    name: "New Person",
    workshopName: "New workshop",
    email: `${personId}@example.org`,
    password: "a password of the tests",
    cautionsAcknowledged: true,
  };
}

function nameEdit() {
  return { path: ["axle", "name"], from: plainStudy.axle.name, to: `Axle ${randomUUID()}` };
}

function fill(route: Route, workshopId: string): string {
  const { work, commentId, sheetId } = house;
  const { buildId, studyId } = work;
  return pathTo(route, { workshopId, buildId, studyId, commentId, sheetId, number: 1 });
}

function request(client: Client, route: Route, workshopId = house.shop.id): Promise<Reply> {
  const body = BODIES.get(route)?.();
  return client.send(route.method, fill(route, workshopId), body === undefined ? {} : { body });
}

const named = API_ROUTES.map((route) => [`${route.method} ${route.path}`, route] as const);
const closed = named.filter(([, route]) => route.access !== "public");
const ofWorkshops = named.filter(([, { access }]) => access !== "public" && access !== "signedIn");
const ROLES: readonly Role[] = ["owner", "engineer", "fabricator", "reviewer"];

describe("the table of routes", () => {
  test("has a row for every route that the server has registered, and none that it has not", () => {
    const registered = registeredRoutes(api().app.router.stack).sort();
    const rows = [...BODIES.keys()].map((route) => `${route.method} ${route.path}`);
    expect(rows.sort()).toEqual(registered);
  });
});

describe("nobody", () => {
  test.each(closed)("is asked to sign in at %s", async (_name, route) => {
    const reply = await request(createClient(api().url), route);
    expect(problemOf(reply).code).toBe("not_signed_in");
  });
});

describe.each(ROLES)("a %s of the workshop", (role) => {
  test.each(ofWorkshops)(
    "at %s is let in if the policy says so, and told so if not",
    async (_name, route) => {
      const reply = await request(house.shop.members[role].client, route);
      expect(reply.text).not.toMatch(/argon2|password/i);
      const action = route.access as Exclude<Route["access"], "public" | "signedIn">; // ofWorkshops leaves those out
      if (may(role, action))
        expect(OUTCOMES.get(route) ?? [route.status], reply.text).toContain(reply.status);
      else expect(problemOf(reply).code).toBe("not_allowed");
    },
  );
});

describe("the owner of another workshop", () => {
  test.each(ofWorkshops)("finds nothing at %s", async (_name, route) => {
    expect(problemOf(await request(house.stranger, route)).code).toBe("not_found");
  });

  test("finds none of our rows through their own workshop either", async () => {
    const own = await house.stranger.call(auth.me, {});
    const workshopId = own.memberships[0]!.workshopId;
    const withIds = ofWorkshops.filter(([, route]) => /:(build|study|comment|sheet)Id/.test(route.path));
    const codes = await Promise.all(
      withIds.map(
        async ([name, route]) =>
          `${name} ${problemOf(await request(house.stranger, route, workshopId)).code}`,
      ),
    );
    expect(codes).toEqual(withIds.map(([name]) => `${name} not_found`));
  });
});

describe("open routes", () => {
  test.each(named.filter(([, { access }]) => access === "public"))(
    "%s answers nobody",
    async (_name, route) => {
      const reply = await request(createClient(api().url), route);
      expect(OUTCOMES.get(route) ?? [route.status], reply.text).toContain(reply.status);
    },
  );
});

describe("bad input", () => {
  const withBody = named.filter(([, route]) => BODIES.get(route)?.() !== undefined);
  const withIds = named.filter(([, route]) => route.path.includes("/:"));
  const owner = () => house.shop.members.owner.client;

  test.each(withBody)("at %s: a member that nobody knows is refused by its name", async (_name, route) => {
    const body = { ...(BODIES.get(route)!() as object), surprise: 1 };
    const problem = problemOf(await owner().send(route.method, fill(route, house.shop.id), { body }));
    expect(problem.code).toBe("invalid");
    expect(problem.issues!.map(({ path }) => path)).toEqual([["surprise"]]);
  });

  test.each(withBody)("at %s: a list for a body is refused", async (_name, route) => {
    const reply = await owner().send(route.method, fill(route, house.shop.id), { body: [] });
    expect(problemOf(reply).code).toBe("invalid");
  });

  test.each(withIds)("at %s: an id that is none leads nowhere", async (_name, route) => {
    const path = route.path.replace(/:\w+/g, "';--");
    const body = BODIES.get(route)!();
    const reply = await owner().send(route.method, path, body === undefined ? {} : { body });
    expect(problemOf(reply).code).toBe("not_found");
  });
});

interface Layer {
  readonly route?: { readonly path: string; readonly methods?: Record<string, boolean> };
  readonly handle: { readonly stack?: Layer[] };
}

/** As Express knows them: `POST /api/…`. Health and the web client stand beside the API. */
function registeredRoutes(stack: readonly unknown[]): string[] {
  return (stack as readonly Layer[]).flatMap((layer) => {
    if (!layer.route) return registeredRoutes(layer.handle.stack ?? []);
    const { path, methods = {} } = layer.route;
    return path.startsWith("/api/")
      ? Object.keys(methods).map((method) => `${method.toUpperCase()} ${path}`)
      : [];
  });
}
