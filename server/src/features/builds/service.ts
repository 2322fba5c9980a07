import type { Build, BuildList, CreateBuildRequest, RenameBuildRequest } from "@linkwright/contract";
import type { WorkshopScope } from "@linkwright/db";
import { ServiceError } from "../../http/problems.ts";
import * as repo from "./repo.ts";

export async function listBuilds(scope: WorkshopScope): Promise<BuildList> {
  const rows = await repo.listBuilds(scope);
  return { builds: rows.map(presentBuild) };
}

export async function getBuild(scope: WorkshopScope, buildId: string): Promise<Build> {
  const row = await repo.findBuild(scope, buildId);
  if (row === null) throw new ServiceError("not_found");
  return presentBuild(row);
}

export async function createBuild(
  scope: WorkshopScope,
  personId: string,
  request: CreateBuildRequest,
): Promise<Build> {
  await repo.addBuild(scope, { ...request, createdBy: personId });
  const build = await getBuild(scope, request.id);
  if (build.createdBy.id !== personId) throw new ServiceError("id_reused");
  return build;
}

export async function renameBuild(
  scope: WorkshopScope,
  buildId: string,
  { name, summary }: RenameBuildRequest,
): Promise<Build> {
  const change = { ...(name !== undefined && { name }), ...(summary !== undefined && { summary }) };
  if (!(await repo.changeBuild(scope, buildId, change))) throw new ServiceError("not_found");
  return getBuild(scope, buildId);
}

function presentBuild(row: repo.BuildRow): Build {
  return { ...row, createdAt: row.createdAt.toISOString(), updatedAt: row.updatedAt.toISOString() };
}
