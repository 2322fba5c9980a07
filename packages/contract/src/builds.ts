// A build is a vehicle or a kit; it holds studies.

import { z } from "zod";
import { Id, Name, PersonRef, Timestamp, textOf } from "./primitives.ts";
import { defineRoute, NoBody } from "./route.ts";
import { WorkshopParams } from "./workshops.ts";

export const BuildParams = z.strictObject({ workshopId: Id, buildId: Id });

export const Build = z.object({
  id: Id,
  name: z.string(),
  /** What it is, in a few lines; may be empty. */
  summary: z.string(),
  studyCount: z.int(),
  createdBy: PersonRef,
  createdAt: Timestamp,
  updatedAt: Timestamp,
});
export type Build = z.infer<typeof Build>;

export const BuildList = z.object({ builds: z.array(Build) });
export type BuildList = z.infer<typeof BuildList>;

const Summary = textOf(2000);

export const CreateBuildRequest = z.strictObject({
  id: Id,
  name: Name,
  summary: Summary.default(""),
});
export type CreateBuildRequest = z.infer<typeof CreateBuildRequest>;

export const RenameBuildRequest = z.strictObject({
  name: z.exactOptional(Name),
  summary: z.exactOptional(Summary),
});
export type RenameBuildRequest = z.infer<typeof RenameBuildRequest>;

export const buildRoutes = {
  list: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/builds",
    access: "workshop.read",
    params: WorkshopParams,
    body: NoBody,
    answer: BuildList,
    status: 200,
  }),
  create: defineRoute({
    method: "POST",
    path: "/api/workshops/:workshopId/builds",
    access: "build.edit",
    params: WorkshopParams,
    body: CreateBuildRequest,
    answer: Build,
    status: 201,
  }),
  get: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/builds/:buildId",
    access: "workshop.read",
    params: BuildParams,
    body: NoBody,
    answer: Build,
    status: 200,
  }),
  rename: defineRoute({
    method: "PATCH",
    path: "/api/workshops/:workshopId/builds/:buildId",
    access: "build.edit",
    params: BuildParams,
    body: RenameBuildRequest,
    answer: Build,
    status: 200,
  }),
} as const;
