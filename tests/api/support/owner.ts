// The database by its owner's hand: for what no program of ours may do.

import pg from "pg";
import type { TestApi } from "./api.ts";

export async function asOwner(api: TestApi, sql: string, values: unknown[] = []): Promise<unknown[]> {
  const client = new pg.Client({ connectionString: api.database.ownerUrl });
  await client.connect();
  try {
    const { rows } = await client.query(sql, values);
    return rows;
  } finally {
    await client.end();
  }
}
