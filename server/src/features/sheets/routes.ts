import { sheetRoutes } from "@linkwright/contract";
import { Router } from "express";
import type { Storage } from "../../files/storage.ts";
import type { Serve } from "../../http/serve.ts";
import type { JobQueue } from "../../jobs/queue.ts";
import { createSheet, getSheet, listSheets, openSheet } from "./service.ts";

export interface SheetsOptions {
  readonly storage: Storage;
  readonly jobs: JobQueue;
}

export function sheetsRouter(serve: Serve, { storage, jobs }: SheetsOptions): Router {
  const router = Router();
  serve.tenant(router, sheetRoutes.list, ({ scope, params }) => listSheets(scope, params.studyId));
  serve.tenant(router, sheetRoutes.create, ({ scope, personId, params, body }) =>
    createSheet(scope, jobs, personId, params.studyId, body),
  );
  serve.tenant(router, sheetRoutes.get, ({ scope, params }) => getSheet(scope, params.sheetId));
  serve.tenantFile(router, sheetRoutes.download, ({ scope, params }) =>
    openSheet(scope, storage, params.sheetId),
  );
  return router;
}
