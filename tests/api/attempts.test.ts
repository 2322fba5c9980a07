// Guessing passwords and flooding sign-ups: how soon it ends.

import { randomUUID } from "node:crypto";
import { authRoutes } from "@linkwright/contract";
import { expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import { createClient } from "./support/client.ts";
import { buildShop, PASSWORD } from "./support/shop.ts";

const LIMITS = {
  signInPerAddress: { points: 12, seconds: 600 },
  signInPerAccount: { points: 3, seconds: 600 },
  signUpPerAddress: { points: 4, seconds: 600 },
  signUpPerAccount: { points: 2, seconds: 600 },
};
const api = serveApi({ attemptLimits: LIMITS, trustedProxies: 1 });

/** One that comes from the address given, as the proxy in front says. */
function clientFrom(address: string) {
  const client = createClient(api().url);
  return (email: string, password: string) =>
    client.send("POST", "/api/auth/sign-in", {
      body: { email, password },
      headers: { "X-Forwarded-For": address },
    });
}

const statuses = async (replies: Promise<{ status: number }>[]) =>
  (await Promise.all(replies)).map(({ status }) => status).sort();

test("an account takes so many wrong passwords, whichever addresses they come from, and then not even the right one", async () => {
  const { members } = await buildShop(api());
  const guesses = ["10.0.0.1", "10.0.0.2", "10.0.0.3", "10.0.0.4"].map((address) =>
    clientFrom(address)(members.engineer.email, "a guess"),
  );
  // All at once: what is counted only after the password was looked at would let all of them through.
  expect(await statuses(guesses)).toEqual([401, 401, 401, 429]);
  const reply = await clientFrom("10.0.0.5")(members.engineer.email, PASSWORD);
  expect(reply.status).toBe(429);
  const seconds = Number(reply.headers.get("retry-after"));
  expect(seconds).toBeGreaterThan(500);
  expect(seconds).toBeLessThanOrEqual(600);
  expect(reply.json).toMatchObject({ code: "too_many_attempts", retryAfterSeconds: seconds });
});

test("an account that does not exist is counted in the same way", async () => {
  const email = `${randomUUID()}@example.org`;
  const guesses = [1, 2, 3, 4].map(() => clientFrom("10.0.1.1")(email, "a guess"));
  expect(await statuses(guesses)).toEqual([401, 401, 401, 429]);
});

test("signing in forgives what was mistyped before", async () => {
  const { members } = await buildShop(api());
  const from = clientFrom("10.0.2.1");
  const { email } = members.owner;
  for (const password of ["typo", "typpo", PASSWORD, "typo", "typpo", PASSWORD]) {
    expect((await from(email, password)).status).toBe(password === PASSWORD ? 200 : 401);
  }
});

test("one address may try so many accounts, and another one still gets in", async () => {
  const { members } = await buildShop(api());
  const tries = Array.from({ length: 13 }, () =>
    clientFrom("10.0.3.1")(`${randomUUID()}@example.org`, "a guess"),
  );
  expect(await statuses(tries)).toEqual([...Array(12).fill(401), 429]);
  expect((await clientFrom("10.0.3.2")(members.owner.email, PASSWORD)).status).toBe(200);
});

test("sign-ups are limited for an address of mail and for an address of the net", async () => {
  const signUp = (email: string, address: string) =>
    createClient(api().url).send("POST", authRoutes.signUp.path, {
      headers: { "X-Forwarded-For": address },
      body: {
        personId: randomUUID(),
        workshopId: randomUUID(),
        name: "Flood",
        workshopName: "Flood",
        email,
        password: "ten letters and more",
        cautionsAcknowledged: true,
      },
    });
  const email = `${randomUUID()}@example.org`;
  expect(await statuses([1, 2, 3].map((n) => signUp(email, `10.0.4.${n}`)))).toEqual([202, 202, 429]);
  const others = [1, 2, 3, 4, 5].map(() => signUp(`${randomUUID()}@example.org`, "10.0.5.1"));
  expect(await statuses(others)).toEqual([202, 202, 202, 202, 429]);
});
