import type { CreateSheetRequest, Sheet, SheetList } from "@linkwright/contract";
import type { WorkshopScope } from "@linkwright/db";
import type { Storage } from "../../files/storage.ts";
import { ServiceError } from "../../http/problems.ts";
import type { FileAnswer } from "../../http/serve.ts";
import type { JobQueue } from "../../jobs/queue.ts";
import { findRevision } from "../revisions/index.ts";
import { getStudy } from "../studies/index.ts";
import * as repo from "./repo.ts";

export async function listSheets(scope: WorkshopScope, studyId: string): Promise<SheetList> {
  await getStudy(scope, studyId);
  const rows = await repo.listSheets(scope, studyId);
  return { sheets: rows.map(presentSheet) };
}

export async function getSheet(scope: WorkshopScope, sheetId: string): Promise<Sheet> {
  return presentSheet(await getRow(scope, sheetId));
}

/** The row and its job are written together: there is no sheet that nobody will make. */
export async function createSheet(
  scope: WorkshopScope,
  jobs: JobQueue,
  personId: string,
  studyId: string,
  { id, revision, kind, units }: CreateSheetRequest,
): Promise<Sheet> {
  await getStudy(scope, studyId);
  await requireRevision(scope, studyId, revision);
  const isNew = await repo.addSheet(scope, {
    id,
    studyId,
    revisionNumber: revision,
    kind,
    units,
    createdBy: personId,
  });
  if (isNew) await jobs.makeSheet(scope, id);
  const row = await getRow(scope, id);
  const isAsAsked =
    row.studyId === studyId &&
    row.revision === revision &&
    row.kind === kind &&
    row.units === units &&
    row.createdBy.id === personId;
  if (!isAsAsked) throw new ServiceError("id_reused");
  return presentSheet(row);
}

export async function openSheet(
  scope: WorkshopScope,
  storage: Storage,
  sheetId: string,
): Promise<FileAnswer> {
  const { storageKey, fileName, byteSize, failure } = await getRow(scope, sheetId);
  if (storageKey === null || fileName === null || byteSize === null) {
    throw new ServiceError("sheet_not_ready", failure === null ? {} : { detail: failure });
  }
  return {
    fileName,
    byteSize,
    contentType: "text/csv; charset=utf-8",
    open: () => storage.open(storageKey),
  };
}

async function requireRevision(scope: WorkshopScope, studyId: string, revision: number): Promise<void> {
  if (await findRevision(scope, studyId, revision)) return;
  throw new ServiceError("invalid", {
    issues: [
      {
        path: ["revision"],
        value: revision,
        problem: `The study has no revision ${revision}.`,
        hint: "Save the draft as a revision first: sheets are made from revisions only.",
      },
    ],
  });
}

async function getRow(scope: WorkshopScope, sheetId: string): Promise<repo.SheetRow> {
  const row = await repo.findSheet(scope, sheetId);
  if (row === null) throw new ServiceError("not_found");
  return row;
}

function presentSheet({ storageKey: _, ...row }: repo.SheetRow): Sheet {
  return {
    ...row,
    createdAt: row.createdAt.toISOString(),
    finishedAt: row.finishedAt?.toISOString() ?? null,
  };
}
