// Everything the worker does: jobs from the queue, mail from the outbox, sweeping. Any number of workers may run.

import { type Connection, JOB_SCHEMA, QUEUES } from "@linkwright/db";
import PgBoss from "pg-boss";
import { giveUpSheet, makeSheet } from "../features/sheets/index.ts";
import type { Storage } from "../files/storage.ts";
import { describeError, type Log } from "../log.ts";
import { type MailRun, sendDueMail } from "../mail/index.ts";
import { type Repeated, repeat } from "./repeat.ts";
import { sweepExpired } from "./sweep.ts";

export interface WorkerOptions {
  readonly connection: Connection;
  readonly databaseUrl: string;
  readonly storage: Storage;
  readonly transport: MailRun["transport"];
  readonly mailFrom: string;
  readonly log: Log;
  readonly pollMs?: number;
}

export interface Worker {
  /** Resolves when all that was under way is done. */
  readonly stop: () => Promise<void>;
}

const POLL_MS = 1000;
const SWEEP_MS = 5 * 60 * 1000;
const LONGEST_JOB_MS = 30_000;

/** Starts even while the database is away, and takes up its work when it is back. */
export function startWorker(options: WorkerOptions): Worker {
  const { connection, log, pollMs = POLL_MS } = options;
  const { db } = connection;
  const jobs = startJobs(options, pollMs);
  const now = () => new Date();
  const mail: MailRun = { db, transport: options.transport, from: options.mailFrom, now, log };
  const loops: readonly Repeated[] = [
    repeat(
      pollMs,
      logged(log, "outbox", async () => void (await sendDueMail(mail))),
    ),
    repeat(
      SWEEP_MS,
      logged(log, "sweep", () => sweepExpired(db, now())),
    ),
  ];
  return {
    async stop() {
      await Promise.all([jobs.stop(), ...loops.map((loop) => loop.stop())]);
    },
  };
}

function startJobs(options: WorkerOptions, pollMs: number): Worker {
  const { databaseUrl, log } = options;
  let boss: PgBoss | null = null;
  const start = async () => {
    if (boss !== null) return;
    const starting = new PgBoss({
      connectionString: databaseUrl,
      schema: JOB_SCHEMA,
      migrate: false,
      max: 3,
    });
    starting.on("error", (error) => log.error("job queue", describeError(error)));
    await starting.start().catch(async (error: unknown) => {
      await starting.stop({ graceful: false }).catch(() => {});
      throw error;
    });
    boss = starting;
    await workOnSheets(starting, options, pollMs);
    log.info("worker takes jobs");
  };
  const starter = repeat(pollMs, logged(log, "job queue", start));
  return {
    async stop() {
      await starter.stop();
      await boss?.stop({ graceful: true, wait: true, timeout: LONGEST_JOB_MS });
    },
  };
}

async function workOnSheets(
  boss: PgBoss,
  { connection: { db }, storage, log }: WorkerOptions,
  pollMs: number,
): Promise<void> {
  const pollingIntervalSeconds = Math.max(0.5, pollMs / 1000);
  await boss.work<{ workshopId: string; sheetId: string }>(
    QUEUES.makeSheet,
    { pollingIntervalSeconds, includeMetadata: true, batchSize: 1 },
    async ([job]) => {
      if (!job) return;
      try {
        await makeSheet(db, storage, job.data);
        log.info("sheet made", { sheetId: job.data.sheetId });
      } catch (error) {
        log.error("sheet not made", {
          sheetId: job.data.sheetId,
          try: job.retryCount,
          ...describeError(error),
        });
        if (job.retryCount >= job.retryLimit) await giveUpSheet(db, job.data);
        throw error;
      }
    },
  );
}

/** One bad round is told and the next one tried: the database may be away for a while. */
function logged(log: Log, what: string, work: () => Promise<void>): () => Promise<void> {
  return async () => {
    try {
      await work();
    } catch (error) {
      log.error(what, describeError(error));
    }
  };
}
