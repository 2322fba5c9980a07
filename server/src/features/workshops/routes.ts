import { workshopRoutes } from "@linkwright/contract";
import { Router } from "express";
import type { Serve } from "../../http/serve.ts";
import { listMembers } from "./service.ts";

export function workshopsRouter(serve: Serve): Router {
  const router = Router();
  serve.tenant(router, workshopRoutes.members, ({ scope }) => listMembers(scope));
  return router;
}
