import { buildRoutes } from "@linkwright/contract";
import { Router } from "express";
import type { Serve } from "../../http/serve.ts";
import { createBuild, getBuild, listBuilds, renameBuild } from "./service.ts";

export function buildsRouter(serve: Serve): Router {
  const router = Router();
  serve.tenant(router, buildRoutes.list, ({ scope }) => listBuilds(scope));
  serve.tenant(router, buildRoutes.create, ({ scope, personId, body }) => createBuild(scope, personId, body));
  serve.tenant(router, buildRoutes.get, ({ scope, params }) => getBuild(scope, params.buildId));
  serve.tenant(router, buildRoutes.rename, ({ scope, params, body }) =>
    renameBuild(scope, params.buildId, body),
  );
  return router;
}
