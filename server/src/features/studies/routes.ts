import { studyRoutes } from "@linkwright/contract";
import { Router } from "express";
import type { Serve } from "../../http/serve.ts";
import { saveEdits } from "./saveEdits.ts";
import { createStudy, getStudy, listStudies, renameStudy } from "./service.ts";

export function studiesRouter(serve: Serve): Router {
  const router = Router();
  serve.tenant(router, studyRoutes.list, ({ scope, params }) => listStudies(scope, params.buildId));
  serve.tenant(router, studyRoutes.create, ({ scope, personId, params, body }) =>
    createStudy(scope, personId, params.buildId, body),
  );
  serve.tenant(router, studyRoutes.get, ({ scope, params }) => getStudy(scope, params.studyId));
  serve.tenant(router, studyRoutes.rename, ({ scope, personId, params, body }) =>
    renameStudy(scope, personId, params.studyId, body),
  );
  serve.tenant(router, studyRoutes.saveEdits, ({ scope, personId, params, body }) =>
    saveEdits(scope, personId, params.studyId, body),
  );
  return router;
}
