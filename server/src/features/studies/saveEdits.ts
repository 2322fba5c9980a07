import { parseStudy, type SavedDraft, type SaveEditsRequest } from "@linkwright/contract";
import { hashDocument, type WorkshopScope } from "@linkwright/db";
import { ServiceError } from "../../http/problems.ts";
import { mergeEdits, rewind } from "./mergeEdits.ts";
import * as repo from "./repo.ts";
import { readStoredStudy } from "./storedStudy.ts";

type Draft = NonNullable<Awaited<ReturnType<typeof repo.lockDraft>>>;

/** Saves all of the edits or none. Whatever it refuses, the client still has, and is told what stands in the way. */
export async function saveEdits(
  scope: WorkshopScope,
  personId: string,
  studyId: string,
  request: SaveEditsRequest,
): Promise<SavedDraft> {
  const draft = await repo.lockDraft(scope, studyId);
  if (draft === null) throw new ServiceError("not_found");
  const requestHash = hashDocument({ baseVersion: request.baseVersion, edits: request.edits });
  const repeated = await answerRepeat(scope, personId, draft, request.id, requestHash);
  if (repeated) return repeated;
  requireKnownBase(request, draft);

  const since = await repo.listSavesAfter(scope, studyId, request.baseVersion);
  const merge = mergeEdits(draft.draft, request.edits, since);
  if (merge.status === "misdirected") throw new ServiceError("invalid", { issues: merge.issues });
  if (merge.status === "conflict") {
    throw new ServiceError("edit_conflict", {
      conflict: { version: draft.version, edits: [...merge.conflicts] },
    });
  }
  const parsed = parseStudy(merge.draft);
  if (!parsed.ok) throw new ServiceError("study_refused", { issues: parsed.issues });

  const version = draft.version + 1;
  await repo.writeDraft(scope, studyId, {
    draft: parsed.value,
    draftFormat: parsed.value.format,
    version,
    updatedBy: personId,
  });
  await repo.addSave(scope, {
    id: request.id,
    studyId,
    version,
    baseVersion: request.baseVersion,
    requestHash,
    edits: merge.done,
    createdBy: personId,
  });
  return { version, draft: parsed.value };
}

/** The answer that this save got the first time, worked back from the draft of today. */
async function answerRepeat(
  scope: WorkshopScope,
  personId: string,
  draft: Draft,
  saveId: string,
  requestHash: string,
): Promise<SavedDraft | null> {
  const save = await repo.findSave(scope, saveId);
  if (save === null) return null;
  const isSame = save.studyId === draft.id && save.createdBy === personId && save.requestHash === requestHash;
  if (!isSame) throw new ServiceError("id_reused");
  const later = await repo.listSavesAfter(scope, draft.id, save.version);
  return { version: save.version, draft: readStoredStudy(rewind(draft.draft, later)) };
}

function requireKnownBase({ baseVersion }: SaveEditsRequest, draft: Draft): void {
  if (baseVersion <= draft.version) return;
  throw new ServiceError("invalid", {
    issues: [
      {
        path: ["baseVersion"],
        value: baseVersion,
        problem: `The draft has no version ${baseVersion}; it is at ${draft.version}.`,
        hint: "Read the draft again and make the edits on its version.",
      },
    ],
  });
}
