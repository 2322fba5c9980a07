import { commentRoutes } from "@linkwright/contract";
import { Router } from "express";
import type { Serve } from "../../http/serve.ts";
import { createComment, listComments, settleComment } from "./service.ts";

export function commentsRouter(serve: Serve): Router {
  const router = Router();
  serve.tenant(router, commentRoutes.list, ({ scope, params }) => listComments(scope, params.studyId));
  serve.tenant(router, commentRoutes.create, ({ scope, personId, params, body }) =>
    createComment(scope, personId, params.studyId, body),
  );
  serve.tenant(router, commentRoutes.settle, ({ scope, personId, role, params, body }) =>
    settleComment(scope, { personId, role }, params.commentId, body.resolved),
  );
  return router;
}
