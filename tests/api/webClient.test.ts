// How the exported web client is served: its files, its one page, and the policy that guards both.

import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, test } from "vitest";
import { startApi, type TestApi } from "./support/api.ts";
import { createClient, problemOf } from "./support/client.ts";

const SCRIPT = "_expo/static/js/web/entry-0123abcd.js";
const PAGE = "<!doctype html><title>Linkwright</title>";
let webDir: string;
let api: TestApi;

beforeAll(async () => {
  webDir = mkdtempSync(join(tmpdir(), "linkwright-web-"));
  const write = (path: string, text: string) => {
    mkdirSync(join(webDir, path, ".."), { recursive: true });
    writeFileSync(join(webDir, path), text);
  };
  write("index.html", PAGE);
  write(SCRIPT, "export {};");
  write("assets/font.0123abcd.woff2", "font");
  write("favicon.ico", "icon");
  write("../linkwright-secret.txt", "secret");
  api = await startApi({ webDir });
});

afterAll(async () => {
  await api?.stop();
  rmSync(webDir, { recursive: true, force: true });
});

const get = (path: string) => createClient(api.url).send("GET", path);

test.each(["/", "/sign-in", "/builds/some-id/points", "/a/b/c?x=1"])(
  "%s is the one page, never kept",
  async (path) => {
    const reply = await get(path);
    expect(reply).toMatchObject({ status: 200, text: PAGE });
    expect(reply.headers.get("content-type")).toMatch(/^text\/html/);
    expect(reply.headers.get("cache-control")).toBe("no-cache");
  },
);

test.each([`/${SCRIPT}`, "/assets/font.0123abcd.woff2"])(
  "%s, whose name bears a hash, is kept for good",
  async (path) => {
    const reply = await get(path);
    expect(reply.status).toBe(200);
    expect(reply.headers.get("cache-control")).toBe("public, max-age=31536000, immutable");
  },
);

test.each(["/_expo/static/js/web/entry-gone.js", "/assets/gone.woff2"])(
  "%s, of an older export, is not found: a page would be taken for the script",
  async (path) => {
    expect(problemOf(await get(path)).code).toBe("not_found");
  },
);

test.each([
  "/..%2flinkwright-secret.txt",
  "/%2e%2e/linkwright-secret.txt",
  "/assets/..%2f..%2flinkwright-secret.txt",
])("%s does not lead out of the folder", async (path) => {
  expect((await get(path)).text).not.toContain("secret");
});

describe("the content policy", () => {
  test("lets in nothing but our own files", async () => {
    for (const path of ["/", `/${SCRIPT}`, "/api/me", "/healthz"]) {
      const policy = (await get(path)).headers.get("content-security-policy");
      expect(policy).toContain("default-src 'self'");
      expect(policy).toContain("script-src 'self';");
      expect(policy).toContain("frame-ancestors 'none'");
      expect(policy).not.toContain("upgrade-insecure-requests");
    }
  });
});

test("without a client the API alone is served", async () => {
  const bare = await startApi();
  const reply = await createClient(bare.url).send("GET", "/");
  await bare.stop();
  expect(problemOf(reply).code).toBe("not_found");
});
