// Signing up, in and out: what a person gets, and what a stranger does not learn.

import { randomUUID } from "node:crypto";
import { authRoutes, CAUTIONS_EDITION, type SignUpRequest } from "@linkwright/contract";
import { outbox, people } from "@linkwright/db";
import { eq } from "drizzle-orm";
import { describe, expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import { createClient, problemOf } from "./support/client.ts";
import { asOwner } from "./support/owner.ts";
import { buildShop, join, PASSWORD, signIn } from "./support/shop.ts";

const api = serveApi();

function signUpRequest(change: Partial<SignUpRequest> = {}): SignUpRequest {
  const personId = randomUUID();
  return {
    personId,
    workshopId: randomUUID(),
    name: "Nell Shaw",
    workshopName: "Nell's arches",
    email: `${personId}@example.org`,
    password: "scribed and punched",
    cautionsAcknowledged: true,
    ...change,
  };
}

const mailsTo = (email: string) =>
  api().connection.db.select().from(outbox).where(eq(outbox.toAddress, email));

describe("signing up", () => {
  test("makes the person, the workshop with them as owner, and a welcome mail", async () => {
    const request = signUpRequest();
    const client = createClient(api().url);
    expect(await client.call(authRoutes.signUp, {}, request)).toEqual({ email: request.email });
    const me = await client.call(authRoutes.signIn, {}, { email: request.email, password: request.password });
    expect(me).toEqual({
      id: request.personId,
      name: "Nell Shaw",
      email: request.email,
      preferences: { units: "mm", dialect: "uk", theme: "system" },
      memberships: [{ workshopId: request.workshopId, workshopName: "Nell's arches", role: "owner" }],
    });
    const mails = await mailsTo(request.email);
    expect(mails.map(({ subject, sentAt }) => ({ subject, sentAt }))).toEqual([
      { subject: "Welcome to Linkwright", sentAt: null },
    ]);
    expect(mails[0]!.bodyText).toContain("Nell's arches");
  });

  test("records which cautions were acknowledged, and when", async () => {
    const request = signUpRequest();
    const before = Date.now();
    await createClient(api().url).call(authRoutes.signUp, {}, request);
    const [row] = await api().connection.db.select().from(people).where(eq(people.id, request.personId));
    expect(row!.cautionsEdition).toBe(CAUTIONS_EDITION);
    expect(row!.cautionsAcknowledgedAt.getTime()).toBeGreaterThanOrEqual(before);
  });

  test("is refused while the cautions are not acknowledged, and makes nothing", async () => {
    const request = { ...signUpRequest(), cautionsAcknowledged: false };
    const problem = await createClient(api().url).refused(authRoutes.signUp, {}, request);
    expect(problem.code).toBe("invalid");
    expect(problem.issues!.map(({ path }) => path)).toEqual([["cautionsAcknowledged"]]);
    expect(await mailsTo(request.email)).toEqual([]);
  });

  test("sent twice makes one account and one mail", async () => {
    const request = signUpRequest();
    const client = createClient(api().url);
    const first = await client.call(authRoutes.signUp, {}, request);
    const second = await client.call(authRoutes.signUp, {}, request);
    expect(second).toEqual(first);
    expect(await mailsTo(request.email)).toHaveLength(1);
  });

  test("with an address that has an account answers the same, changes nothing and tells its owner by mail", async () => {
    const known = signUpRequest();
    const client = createClient(api().url);
    await client.call(authRoutes.signUp, {}, known);
    const intruder = signUpRequest({ email: known.email.toUpperCase(), password: "another password" });
    expect(await client.call(authRoutes.signUp, {}, intruder)).toEqual({ email: known.email });
    const problem = await client.refused(
      authRoutes.signIn,
      {},
      { email: known.email, password: intruder.password },
    );
    expect(problem.code).toBe("wrong_credentials");
    const subjects = (await mailsTo(known.email)).map(({ subject }) => subject).sort();
    expect(subjects).toEqual(["Welcome to Linkwright", "You already have a Linkwright account"]);
    const me = await client.call(authRoutes.signIn, {}, { email: known.email, password: known.password });
    expect(me.memberships).toHaveLength(1);
  });

  test("cannot take over a workshop by its id", async () => {
    const shop = await buildShop(api());
    const request = signUpRequest({ workshopId: shop.id });
    const problem = await createClient(api().url).refused(authRoutes.signUp, {}, request);
    expect(problem.code).toBe("id_reused");
    expect(await mailsTo(request.email)).toEqual([]);
  });

  test("tells every field that is wrong, with what to do, and repeats no password", async () => {
    const request = { ...signUpRequest(), name: " ", email: "not an address", password: "short", extra: 1 };
    const reply = await createClient(api().url).send("POST", "/api/auth/sign-up", { body: request });
    const { code, issues } = problemOf(reply);
    expect(code).toBe("invalid");
    expect(issues!.map(({ path }) => path.join(".")).sort()).toEqual(["email", "extra", "name", "password"]);
    for (const issue of issues!) {
      expect(issue.problem).not.toBe("");
      expect(issue.hint).not.toBe("");
    }
    expect(reply.text).not.toContain("short");
  });
});

describe("signing in", () => {
  test("fails with the same words for a wrong password and for an address nobody has", async () => {
    const { members } = await buildShop(api());
    const client = createClient(api().url);
    const wrong = await client.refused(
      authRoutes.signIn,
      {},
      { email: members.engineer.email, password: "not this" },
    );
    const nobody = await client.refused(
      authRoutes.signIn,
      {},
      { email: `${randomUUID()}@example.org`, password: PASSWORD },
    );
    expect({ ...wrong, requestId: "" }).toEqual({ ...nobody, requestId: "" });
    expect(wrong.code).toBe("wrong_credentials");
    expect(client.cookies.size).toBe(0);
  });

  test("spends a password hash's time on an address that nobody has, too", async () => {
    const request = signUpRequest();
    const client = createClient(api().url);
    await client.call(authRoutes.signUp, {}, request);
    const spend = async (email: string) => {
      const began = performance.now();
      await client.refused(authRoutes.signIn, {}, { email, password: "not the password" });
      return performance.now() - began;
    };
    const spent: Record<"nobody" | "somebody", number[]> = { nobody: [], somebody: [] };
    for (let round = 0; round < 4; round += 1) {
      spent.nobody.push(await spend(`${randomUUID()}@example.org`));
      spent.somebody.push(await spend(request.email));
    }
    // The least of several, taken in turns, so that a busy machine does not count. Without the hash it is a twentieth.
    expect(Math.min(...spent.nobody)).toBeGreaterThan(0.3 * Math.min(...spent.somebody));
  });

  test("sets a cookie that scripts cannot read and other sites do not send", async () => {
    const { members } = await buildShop(api());
    const body = { email: members.owner.email.toUpperCase(), password: PASSWORD };
    const reply = await createClient(api().url).send("POST", "/api/auth/sign-in", { body });
    expect(reply.status).toBe(200);
    const [cookie] = reply.headers.getSetCookie();
    expect(cookie).toMatch(/^linkwright=/);
    expect(cookie).toMatch(/; Path=\/;/);
    expect(cookie).toMatch(/; HttpOnly/);
    expect(cookie).toMatch(/; SameSite=Lax/);
  });

  test("takes no session that was there before: a planted one stays signed out", async () => {
    const { members } = await buildShop(api());
    const attacker = await signIn(api(), members.reviewer.email);
    const planted = attacker.cookies.get("linkwright")!;
    const victim = createClient(api().url);
    victim.cookies.set("linkwright", planted);
    await victim.call(authRoutes.signIn, {}, { email: members.owner.email, password: PASSWORD });
    expect(victim.cookies.get("linkwright")).not.toBe(planted);
    const problem = await attacker.refused(authRoutes.me, {});
    expect(problem.code).toBe("not_signed_in");
  });

  test("a cookie whose signature is not ours is nobody's", async () => {
    const { members } = await buildShop(api());
    const client = await signIn(api(), members.owner.email);
    const [id] = decodeURIComponent(client.cookies.get("linkwright")!).split(".");
    client.cookies.set("linkwright", encodeURIComponent(`${id}.${"A".repeat(43)}`));
    expect((await client.refused(authRoutes.me, {})).code).toBe("not_signed_in");
  });
});

describe("signing out", () => {
  test("ends the session itself, not only the cookie", async () => {
    const { members } = await buildShop(api());
    const client = await signIn(api(), members.owner.email);
    const kept = new Map(client.cookies);
    await client.call(authRoutes.signOut, {});
    expect(client.cookies.size).toBe(0);
    for (const [name, value] of kept) client.cookies.set(name, value);
    expect((await client.refused(authRoutes.me, {})).code).toBe("not_signed_in");
  });

  test("does no harm to whoever is not signed in", async () => {
    await createClient(api().url).call(authRoutes.signOut, {});
  });
});

describe("one's own profile", () => {
  test("keeps what is changed and leaves the rest", async () => {
    const { members } = await buildShop(api());
    const { client } = members.fabricator;
    const me = await client.call(authRoutes.changeMe, {}, { units: "inch", theme: "dark" });
    expect(me.preferences).toEqual({ units: "inch", dialect: "uk", theme: "dark" });
    expect(await client.call(authRoutes.changeMe, {}, {})).toEqual(me);
    expect(await client.call(authRoutes.me, {})).toEqual(me);
  });

  test.each([
    [{ units: "cubit" }, ["units"]],
    [{ role: "owner" }, ["role"]],
    [{ name: "two\nlines" }, ["name"]],
  ])("refuses %j", async (change, path) => {
    const { members } = await buildShop(api());
    const problem = await members.reviewer.client.refused(authRoutes.changeMe, {}, change);
    expect(problem.issues!.map((issue) => issue.path)).toEqual([path]);
  });

  test("lists every workshop one belongs to, with the role in each", async () => {
    const [first, second] = [await buildShop(api(), "Anvil"), await buildShop(api(), "Bellows")];
    await join(api(), second.id, first.members.engineer.id, "reviewer");
    const me = await first.members.engineer.client.call(authRoutes.me, {});
    expect(me.memberships).toEqual([
      { workshopId: first.id, workshopName: "Anvil", role: "engineer" },
      { workshopId: second.id, workshopName: "Bellows", role: "reviewer" },
    ]);
  });

  test("a session whose person is gone is nobody's", async () => {
    const request = signUpRequest();
    const client = createClient(api().url);
    await client.call(authRoutes.signUp, {}, request);
    await client.call(authRoutes.signIn, {}, { email: request.email, password: request.password });
    await asOwner(api(), "delete from memberships where person_id = $1", [request.personId]);
    await asOwner(api(), "delete from people where id = $1", [request.personId]);
    expect((await client.refused(authRoutes.me, {})).code).toBe("not_signed_in");
  });
});
