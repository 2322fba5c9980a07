// Every route of the API in one list: the server serves these and no others.

import { authRoutes } from "./auth.ts";
import { buildRoutes } from "./builds.ts";
import { commentRoutes } from "./comments.ts";
import { revisionRoutes } from "./revisions.ts";
import type { Route } from "./route.ts";
import { sheetRoutes } from "./sheets.ts";
import { studyRoutes } from "./studies.ts";
import { workshopRoutes } from "./workshops.ts";

export const apiRoutes = {
  auth: authRoutes,
  workshops: workshopRoutes,
  builds: buildRoutes,
  studies: studyRoutes,
  revisions: revisionRoutes,
  comments: commentRoutes,
  sheets: sheetRoutes,
} as const;

export const API_ROUTES: readonly Route[] = Object.values(apiRoutes).flatMap(
  (feature) => Object.values(feature) as Route[],
);
