import { revisionRoutes } from "@linkwright/contract";
import { Router } from "express";
import type { Serve } from "../../http/serve.ts";
import { getRevision, listRevisions, saveRevision } from "./service.ts";

export function revisionsRouter(serve: Serve): Router {
  const router = Router();
  serve.tenant(router, revisionRoutes.list, ({ scope, params }) => listRevisions(scope, params.studyId));
  serve.tenant(router, revisionRoutes.save, ({ scope, personId, params, body }) =>
    saveRevision(scope, personId, params.studyId, body),
  );
  serve.tenant(router, revisionRoutes.get, ({ scope, params }) =>
    getRevision(scope, params.studyId, params.number),
  );
  return router;
}
