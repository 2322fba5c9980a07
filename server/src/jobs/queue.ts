// Putting work in the queue, inside the transaction that asks for it.

import { JOB_SCHEMA, QUEUES, type Tx, type WorkshopScope } from "@linkwright/db";
import { type SQL, sql } from "drizzle-orm";
import PgBoss from "pg-boss";

export interface JobQueue {
  readonly makeSheet: (scope: WorkshopScope, sheetId: string) => Promise<void>;
}

/** pg-boss is never started here: it only writes the job, by the transaction's own connection. */
export function createJobQueue(): JobQueue {
  const boss = new PgBoss({ schema: JOB_SCHEMA, db: { executeSql: refuseOwnConnection } });
  return {
    async makeSheet({ tx, workshopId }, sheetId) {
      await boss.send(QUEUES.makeSheet, { workshopId, sheetId }, { db: throughTransaction(tx) });
    },
  };
}

function throughTransaction(tx: Tx): PgBoss.Db {
  return {
    async executeSql(text, values) {
      const { rows } = await tx.execute(bind(text, values));
      return { rows };
    },
  };
}

/** pg-boss numbers its parameters ($1, $2 …); drizzle wants them where they stand. */
function bind(text: string, values: readonly unknown[]): SQL {
  const parts = text.split(/\$(\d+)/);
  return sql.join(
    parts.map((part, at) =>
      at % 2 === 0 ? sql.raw(part) : sql`${sql.param(values[Number(part) - 1] ?? null)}`,
    ),
  );
}

function refuseOwnConnection(): never {
  throw new Error("a job is only ever written inside a transaction");
}
