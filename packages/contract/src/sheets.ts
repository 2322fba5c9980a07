// Sheets: what leaves the house on paper or as a file, made from a revision by the job worker.

import { z } from "zod";
import { Id, LengthUnit, PersonRef, Timestamp } from "./primitives.ts";
import { defineRoute, NoAnswer, NoBody } from "./route.ts";
import { StudyParams } from "./studies.ts";

export const SheetKind = z.enum(["hardpointTable"]);
export type SheetKind = z.infer<typeof SheetKind>;

export const SheetParams = z.strictObject({ workshopId: Id, sheetId: Id });

export const Sheet = z.object({
  id: Id,
  studyId: Id,
  revision: z.int(),
  kind: SheetKind,
  units: LengthUnit,
  status: z.enum(["queued", "made", "failed"]),
  /** Why it failed, and what to do; null otherwise. */
  failure: z.string().nullable(),
  /** Null until it is made. */
  fileName: z.string().nullable(),
  byteSize: z.int().nullable(),
  createdBy: PersonRef,
  createdAt: Timestamp,
  finishedAt: Timestamp.nullable(),
});
export type Sheet = z.infer<typeof Sheet>;

export const SheetList = z.object({ sheets: z.array(Sheet) });
export type SheetList = z.infer<typeof SheetList>;

export const CreateSheetRequest = z.strictObject({
  id: Id,
  revision: z
    .int()
    .min(1)
    .max(2 ** 31 - 1),
  kind: SheetKind,
  units: LengthUnit,
});
export type CreateSheetRequest = z.infer<typeof CreateSheetRequest>;

export const sheetRoutes = {
  list: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/studies/:studyId/sheets",
    access: "workshop.read",
    params: StudyParams,
    body: NoBody,
    answer: SheetList,
    status: 200,
  }),
  create: defineRoute({
    method: "POST",
    path: "/api/workshops/:workshopId/studies/:studyId/sheets",
    access: "sheet.make",
    params: StudyParams,
    body: CreateSheetRequest,
    answer: Sheet,
    status: 202,
  }),
  get: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/sheets/:sheetId",
    access: "workshop.read",
    params: SheetParams,
    body: NoBody,
    answer: Sheet,
    status: 200,
  }),
  /** The file itself, as an attachment. */
  download: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/sheets/:sheetId/file",
    access: "workshop.read",
    params: SheetParams,
    body: NoBody,
    answer: NoAnswer,
    status: 200,
  }),
} as const;
