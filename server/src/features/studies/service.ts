import type {
  CreateStudyRequest,
  RenameStudyRequest,
  StudyAnswer,
  StudyList,
  StudySummary,
} from "@linkwright/contract";
import type { WorkshopScope } from "@linkwright/db";
import { checkStudy, type Study } from "@linkwright/kinematics";
import { ServiceError } from "../../http/problems.ts";
import { getBuild } from "../builds/index.ts";
import * as repo from "./repo.ts";
import { readStoredStudy } from "./storedStudy.ts";

export async function listStudies(scope: WorkshopScope, buildId: string): Promise<StudyList> {
  await getBuild(scope, buildId);
  const rows = await repo.listStudies(scope, buildId);
  return { studies: rows.map((row) => presentSummary(row, readStoredStudy(row.draft))) };
}

export async function getStudy(scope: WorkshopScope, studyId: string): Promise<StudyAnswer> {
  const row = await repo.findStudy(scope, studyId);
  if (row === null) throw new ServiceError("not_found");
  const draft = readStoredStudy(row.draft);
  return { ...presentSummary(row, draft), draft };
}

export async function createStudy(
  scope: WorkshopScope,
  personId: string,
  buildId: string,
  { id, name, source }: CreateStudyRequest,
): Promise<StudyAnswer> {
  await getBuild(scope, buildId);
  const draft = source.type === "document" ? checked(source.study) : await copyOf(scope, source.studyId);
  await repo.addStudy(scope, {
    id,
    buildId,
    name,
    draft,
    draftFormat: draft.format,
    createdBy: personId,
    updatedBy: personId,
  });
  const study = await getStudy(scope, id);
  if (study.createdBy.id !== personId || study.buildId !== buildId) throw new ServiceError("id_reused");
  return study;
}

export async function renameStudy(
  scope: WorkshopScope,
  personId: string,
  studyId: string,
  { name }: RenameStudyRequest,
): Promise<StudyAnswer> {
  const isThere = await repo.renameStudy(scope, studyId, { name, updatedBy: personId });
  if (!isThere) throw new ServiceError("not_found");
  return getStudy(scope, studyId);
}

function checked(study: Study): Study {
  const issues = checkStudy(study);
  if (issues.length === 0) return study;
  const inRequest = issues.map((issue) => ({ ...issue, path: ["source", "study", ...issue.path] }));
  throw new ServiceError("study_refused", { issues: inRequest });
}

async function copyOf(scope: WorkshopScope, studyId: string): Promise<Study> {
  const row = await repo.findStudy(scope, studyId);
  if (row) return readStoredStudy(row.draft);
  throw new ServiceError("invalid", {
    issues: [
      {
        path: ["source", "studyId"],
        value: studyId,
        problem: "There is no such study to copy.",
        hint: "Choose a study of this workshop.",
      },
    ],
  });
}

function presentSummary(row: repo.StudyRow, draft: Study): StudySummary {
  const { draft: _, ...summary } = row;
  return {
    ...summary,
    position: draft.axle.position,
    createdAt: row.createdAt.toISOString(),
    updatedAt: row.updatedAt.toISOString(),
  };
}
