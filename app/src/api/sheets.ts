import { type CreateSheetRequest, sheetRoutes } from "@linkwright/contract";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { callApi, fileUrl } from "./client.ts";
import { studiesKey } from "./studies.ts";

/** While a sheet is in the making, how often it is asked after. */
const ASK_EVERY_MS = 1500;

export const sheetsQuery = (workshopId: string, studyId: string) =>
  queryOptions({
    queryKey: [...studiesKey(workshopId), studyId, "sheets"],
    queryFn: ({ signal }) => callApi(sheetRoutes.list, { params: { workshopId, studyId }, signal }),
    refetchInterval: ({ state }) =>
      state.data?.sheets.some(({ status }) => status === "queued") ? ASK_EVERY_MS : false,
  });

export function useRequestSheet(workshopId: string, studyId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CreateSheetRequest) =>
      callApi(sheetRoutes.create, { params: { workshopId, studyId }, body }),
    onSuccess: () => client.invalidateQueries({ queryKey: sheetsQuery(workshopId, studyId).queryKey }),
  });
}

export function sheetFileUrl(workshopId: string, sheetId: string): string {
  return fileUrl(sheetRoutes.download, { workshopId, sheetId });
}
