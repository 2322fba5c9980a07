// For whatever watches the process: is it alive, and can it do its work.

import type { Db } from "@linkwright/db";
import { sql } from "drizzle-orm";
import { Router } from "express";

export function healthRouter(db: Db): Router {
  const router = Router();
  router.get("/healthz", (_request, response) => {
    response.set("Cache-Control", "no-store").json({ status: "alive" });
  });
  router.get("/readyz", async (_request, response) => {
    await db.execute(sql`select 1`);
    response.set("Cache-Control", "no-store").json({ status: "ready" });
  });
  return router;
}
