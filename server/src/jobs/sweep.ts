// Rows that have had their time: sessions that expired, attempts that nobody counts any more.

import { type Db, rateLimits, sessions } from "@linkwright/db";
import { lt } from "drizzle-orm";

export async function sweepExpired(db: Db, now: Date): Promise<void> {
  await db.delete(sessions).where(lt(sessions.expire, now));
  await db.delete(rateLimits).where(lt(rateLimits.expire, now.getTime()));
}
