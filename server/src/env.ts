// The settings of server and worker, read once from the environment. What is wrong is told all at once.

import { z } from "zod";

const Flagless = z.string().min(1);

const DatabaseEnv = {
  DATABASE_URL: z.url({
    protocol: /^postgres(ql)?$/,
    message: "is not the address of a PostgreSQL database",
  }),
};

const StorageEnv = {
  S3_ENDPOINT: z.url({ protocol: /^https?$/, message: "is not an http address" }),
  S3_REGION: Flagless.default("us-east-1"),
  S3_BUCKET: Flagless,
  S3_ACCESS_KEY_ID: Flagless,
  S3_SECRET_ACCESS_KEY: Flagless,
};

const MailEnv = {
  PUBLIC_URL: z.url({ protocol: /^https?$/, message: "is not an http address" }),
  /** As in a mail's head: `Linkwright <mail@example.org>` or the address alone. */
  MAIL_FROM: z.string().regex(/[^\s<>@]+@[^\s<>@]+>?$/, "is not an e-mail address"),
};

const ServerEnv = z.object({
  ...DatabaseEnv,
  ...StorageEnv,
  ...MailEnv,
  PORT: z.coerce.number().int().min(0).max(65_535).default(3000),
  HOST: Flagless.default("127.0.0.1"),
  SESSION_SECRET: z.string().min(32, "has fewer than 32 characters"),
  /** The folder of the exported web client; without it only the API is served. */
  WEB_DIR: Flagless.optional(),
  /** How many proxies stand in front and add to X-Forwarded-For; 0 trusts nobody's word on the client's address. */
  TRUSTED_PROXIES: z.coerce.number().int().min(0).max(10).default(0),
});
export type ServerEnv = z.infer<typeof ServerEnv>;

const WorkerEnv = z.object({
  ...DatabaseEnv,
  ...StorageEnv,
  ...MailEnv,
  SMTP_URL: z.url({ protocol: /^smtps?$/, message: "is not the address of a mail server (smtp://…)" }),
});
export type WorkerEnv = z.infer<typeof WorkerEnv>;

export type StorageSettings = Pick<ServerEnv, keyof typeof StorageEnv>;

type Source = Readonly<Record<string, string | undefined>>;

export function readServerEnv(source: Source): ServerEnv {
  return read(ServerEnv, source);
}

export function readWorkerEnv(source: Source): WorkerEnv {
  return read(WorkerEnv, source);
}

function read<T>(schema: z.ZodType<T>, source: Source): T {
  const parsed = schema.safeParse(source);
  if (parsed.success) return parsed.data;
  const lines = parsed.error.issues.map((issue) => {
    const name = issue.path.join(".");
    return source[name] === undefined ? `${name} is not set` : `${name} ${issue.message}`;
  });
  throw new Error(`The environment is not complete:\n  ${lines.join("\n  ")}`);
}
