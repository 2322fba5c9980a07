// The connection to PostgreSQL, and the two scopes in which a tenant's rows can be reached at all.

import { sql } from "drizzle-orm";
import { drizzle, type NodePgDatabase } from "drizzle-orm/node-postgres";
import pg from "pg";
import * as schema from "./schema/index.ts";

export type Db = NodePgDatabase<typeof schema>;
export type Tx = Parameters<Parameters<Db["transaction"]>[0]>[0];

export interface Connection {
  readonly db: Db;
  readonly pool: pg.Pool;
  readonly close: () => Promise<void>;
}

export interface ConnectOptions {
  readonly url: string;
  readonly poolSize?: number;
  /** Told of a connection that broke while nobody used it; the pool replaces it by itself. */
  readonly onIdleError?: (error: Error) => void;
}

/** How long a request waits for a connection before it is told that the database is away. */
const CONNECT_TIMEOUT_MS = 3000;
/** No statement of ours is long; one that is has gone wrong and holds a connection that others wait for. */
const STATEMENT_TIMEOUT_MS = 15_000;

/** Connects nothing yet: the first query does, so that a program starts while the database is still away. */
export function connect({ url, poolSize = 10, onIdleError = () => {} }: ConnectOptions): Connection {
  const pool = new pg.Pool({
    connectionString: url,
    max: poolSize,
    connectionTimeoutMillis: CONNECT_TIMEOUT_MS,
    statement_timeout: STATEMENT_TIMEOUT_MS,
    idle_in_transaction_session_timeout: STATEMENT_TIMEOUT_MS,
    application_name: "linkwright",
  });
  pool.on("error", onIdleError);
  return { db: drizzle(pool, { schema }), pool, close: () => pool.end() };
}

/** A transaction inside one workshop. Repositories of tenant tables take nothing else. */
export interface WorkshopScope {
  readonly tx: Tx;
  readonly workshopId: string;
}

/** A transaction of one person, from which the person's own memberships can be seen. */
export interface PersonScope {
  readonly tx: Tx;
  readonly personId: string;
}

/** Runs `work` in a transaction in which row-level security lets through the rows of this workshop only. */
export function inWorkshop<T>(
  db: Db,
  workshopId: string,
  work: (scope: WorkshopScope) => Promise<T>,
): Promise<T> {
  return db.transaction(async (tx) => {
    await tx.execute(sql`select set_config('linkwright.workshop_id', ${workshopId}, true)`);
    return work({ tx, workshopId });
  });
}

export function asPerson<T>(db: Db, personId: string, work: (scope: PersonScope) => Promise<T>): Promise<T> {
  return db.transaction(async (tx) => {
    await tx.execute(sql`select set_config('linkwright.person_id', ${personId}, true)`);
    return work({ tx, personId });
  });
}
