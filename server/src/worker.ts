// The job worker: a program of its own, so that long work never slows the pages.

import { connect } from "@linkwright/db";
import { createTransport } from "nodemailer";
import { readWorkerEnv } from "./env.ts";
import { createStorage } from "./files/storage.ts";
import { startWorker } from "./jobs/index.ts";
import { onStopSignal } from "./lifecycle.ts";
import { createLog, describeError } from "./log.ts";

const STOP_WITHIN_MS = 35_000;

const env = readWorkerEnv(process.env);
const log = createLog((line) => process.stdout.write(line));
const connection = connect({
  url: env.DATABASE_URL,
  poolSize: 4,
  onIdleError: (error) => log.error("database connection lost", describeError(error)),
});
const storage = createStorage(env);
const transport = createTransport(env.SMTP_URL);
const worker = startWorker({
  connection,
  databaseUrl: env.DATABASE_URL,
  storage,
  transport,
  mailFrom: env.MAIL_FROM,
  log,
});

onStopSignal(log, STOP_WITHIN_MS, async () => {
  await worker.stop();
  transport.close();
  storage.close();
  await connection.close();
});
