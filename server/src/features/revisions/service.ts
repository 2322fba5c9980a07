import type {
  RevisionAnswer,
  RevisionList,
  RevisionSummary,
  SaveRevisionRequest,
} from "@linkwright/contract";
import { hashDocument, type WorkshopScope } from "@linkwright/db";
import { ServiceError } from "../../http/problems.ts";
import { getStudy, lockDraft, readStoredStudy } from "../studies/index.ts";
import * as repo from "./repo.ts";

export async function listRevisions(scope: WorkshopScope, studyId: string): Promise<RevisionList> {
  await getStudy(scope, studyId);
  const rows = await repo.listRevisions(scope, studyId);
  return { revisions: rows.map(presentSummary) };
}

export async function getRevision(
  scope: WorkshopScope,
  studyId: string,
  number: number,
): Promise<RevisionAnswer> {
  const row = await repo.findRevision(scope, studyId, number);
  if (row === null) throw new ServiceError("not_found");
  return { ...presentSummary(row), study: readStoredStudy(row.study) };
}

/** Saves the draft, as it was looked at, as the study's next revision. */
export async function saveRevision(
  scope: WorkshopScope,
  personId: string,
  studyId: string,
  { id, version, note }: SaveRevisionRequest,
): Promise<RevisionAnswer> {
  const draft = await lockDraft(scope, studyId);
  if (draft === null) throw new ServiceError("not_found");
  const known = await repo.findRevisionById(scope, id);
  if (known) {
    const isRepeat =
      known.studyId === studyId &&
      known.createdBy === personId &&
      known.version === version &&
      known.note === note;
    if (!isRepeat) throw new ServiceError("id_reused");
    return getRevision(scope, studyId, known.number);
  }
  if (draft.version !== version) throw new ServiceError("draft_moved");

  const study = readStoredStudy(draft.draft);
  const number = await repo.nextNumber(scope, studyId);
  await repo.addRevision(scope, {
    id,
    studyId,
    number,
    version,
    study,
    studyFormat: study.format,
    hash: hashDocument(study),
    note,
    createdBy: personId,
  });
  return getRevision(scope, studyId, number);
}

function presentSummary(row: repo.RevisionRow): RevisionSummary {
  const { number, note, status, hash, createdBy, createdAt } = row;
  return { number, note, status, hash, createdBy, createdAt: createdAt.toISOString() };
}
