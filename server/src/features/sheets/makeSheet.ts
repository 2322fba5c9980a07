// The worker's part of a sheet: from a revision to a file in the store. Done twice, it does no harm.

import { type Db, inWorkshop, type WorkshopScope } from "@linkwright/db";
import type { Storage } from "../../files/storage.ts";
import { getBuild } from "../builds/index.ts";
import { findRevision } from "../revisions/index.ts";
import { getStudy, readStoredStudy } from "../studies/index.ts";
import { getWorkshopName } from "../workshops/index.ts";
import { type HardpointTable, nameHardpointTable, writeHardpointTable } from "./hardpointTable.ts";
import * as repo from "./repo.ts";

export interface SheetJob {
  readonly workshopId: string;
  readonly sheetId: string;
}

const CSV = "text/csv; charset=utf-8";

export async function makeSheet(db: Db, storage: Storage, { workshopId, sheetId }: SheetJob): Promise<void> {
  const table = await inWorkshop(db, workshopId, (scope) => readTable(scope, sheetId));
  if (table === null) return;
  const bytes = Buffer.from(writeHardpointTable(table), "utf8");
  const storageKey = `workshops/${workshopId}/sheets/${sheetId}.csv`;
  // First the file, then the word that it is there: a worker that dies in between leaves nothing half-made in sight.
  await storage.put({ key: storageKey, contentType: CSV, bytes });
  await inWorkshop(db, workshopId, (scope) =>
    repo.finishSheet(scope, sheetId, {
      status: "made",
      storageKey,
      fileName: nameHardpointTable(table),
      byteSize: bytes.length,
    }),
  );
}

/** Called when no further try will be made. */
export async function giveUpSheet(db: Db, { workshopId, sheetId }: SheetJob): Promise<void> {
  await inWorkshop(db, workshopId, (scope) =>
    repo.finishSheet(scope, sheetId, {
      status: "failed",
      failure: "The sheet could not be made after several tries. Ask for it again in a few minutes.",
    }),
  );
}

/** Null when there is nothing left to make. */
async function readTable(scope: WorkshopScope, sheetId: string): Promise<HardpointTable | null> {
  const sheet = await repo.findSheet(scope, sheetId);
  if (sheet?.status !== "queued") return null;
  const revision = await findRevision(scope, sheet.studyId, sheet.revision);
  if (revision === null) throw new Error(`sheet ${sheetId} is of a revision that is not there`);
  const study = await getStudy(scope, sheet.studyId);
  const build = await getBuild(scope, study.buildId);
  return {
    workshopName: await getWorkshopName(scope),
    buildName: build.name,
    studyName: study.name,
    study: readStoredStudy(revision.study),
    revision: revision.number,
    revisionDate: revision.createdAt,
    status: revision.status,
    hash: revision.hash,
    units: sheet.units,
  };
}
