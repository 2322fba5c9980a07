import { expect, test } from "vitest";
import { readServerEnv, readWorkerEnv } from "./env.ts";

const good = {
  DATABASE_URL: "postgres://app@127.0.0.1:5432/linkwright",
  S3_ENDPOINT: "http://127.0.0.1:9000",
  S3_BUCKET: "files",
  S3_ACCESS_KEY_ID: "key",
  S3_SECRET_ACCESS_KEY: "secret",
  PUBLIC_URL: "https://linkwright.test",
  MAIL_FROM: "Linkwright <mail@linkwright.test>",
  SESSION_SECRET: "a secret that is long enough to be one",
  SMTP_URL: "smtp://127.0.0.1:2525",
};

test("what is left out has a default that is safe to run on", () => {
  const env = readServerEnv(good);
  expect(env).toMatchObject({ PORT: 3000, HOST: "127.0.0.1", S3_REGION: "us-east-1", TRUSTED_PROXIES: 0 });
  expect(env.WEB_DIR).toBeUndefined();
  expect(readWorkerEnv(good).SMTP_URL).toBe(good.SMTP_URL);
});

test("all that is wrong is told at once, each by its name, and no secret is repeated", () => {
  const bad = {
    ...good,
    DATABASE_URL: undefined,
    PORT: "no",
    SESSION_SECRET: "hunter2",
    MAIL_FROM: "nobody",
  };
  expect(() => readServerEnv(bad)).toThrow(
    /DATABASE_URL is not set[\s\S]*MAIL_FROM is not an e-mail address[\s\S]*PORT [\s\S]*SESSION_SECRET has fewer than 32/,
  );
  expect(() => readServerEnv(bad)).not.toThrow(/hunter2/);
});

test.each([
  ["DATABASE_URL", "mysql://x/y"],
  ["PUBLIC_URL", "linkwright.test"],
  ["S3_ENDPOINT", "ftp://files"],
])("%s as %s is refused", (name, value) => {
  expect(() => readServerEnv({ ...good, [name]: value })).toThrow(name);
});
