// The web process: listens, and stops without cutting anybody off.

import { connect } from "@linkwright/db";
import { createApp } from "./app.ts";
import { readServerEnv } from "./env.ts";
import { createStorage } from "./files/storage.ts";
import { onStopSignal } from "./lifecycle.ts";
import { createLog, describeError } from "./log.ts";

/** Longer than any request of ours takes; shorter than what a supervisor waits before it kills. */
const STOP_WITHIN_MS = 8000;

const env = readServerEnv(process.env);
const log = createLog((line) => process.stdout.write(line));
const connection = connect({
  url: env.DATABASE_URL,
  onIdleError: (error) => log.error("database connection lost", describeError(error)),
});
const storage = createStorage(env);
const app = createApp({
  connection,
  storage,
  mail: { publicUrl: env.PUBLIC_URL, from: env.MAIL_FROM },
  sessionSecret: env.SESSION_SECRET,
  webDir: env.WEB_DIR,
  trustedProxies: env.TRUSTED_PROXIES,
  log,
});

const server = app.listen(env.PORT, env.HOST, (error) => {
  // Express hands a failure to listen to this callback instead of emitting it.
  if (error) throw error;
  const address = server.address();
  log.info("listening", { host: env.HOST, port: typeof address === "object" ? address?.port : env.PORT });
});

onStopSignal(log, STOP_WITHIN_MS, async () => {
  const closed = new Promise((resolve) => server.close(resolve));
  server.closeIdleConnections();
  await closed;
  storage.close();
  await connection.close();
});
