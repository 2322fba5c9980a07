import { revisionRoutes, type SaveRevisionRequest } from "@linkwright/contract";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { callApi } from "./client.ts";
import { studiesKey } from "./studies.ts";

export const revisionsQuery = (workshopId: string, studyId: string) =>
  queryOptions({
    queryKey: [...studiesKey(workshopId), studyId, "revisions"],
    queryFn: ({ signal }) => callApi(revisionRoutes.list, { params: { workshopId, studyId }, signal }),
    // Newest first, whatever order they come in.
    select: ({ revisions }) => [...revisions].sort((a, b) => b.number - a.number),
  });

/** A revision never changes, so it is fetched once. */
export const revisionQuery = (workshopId: string, studyId: string, number: number) =>
  queryOptions({
    queryKey: [...studiesKey(workshopId), studyId, "revisions", number],
    queryFn: ({ signal }) => callApi(revisionRoutes.get, { params: { workshopId, studyId, number }, signal }),
    staleTime: Infinity,
  });

export function useSaveRevision(workshopId: string, studyId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SaveRevisionRequest) =>
      callApi(revisionRoutes.save, { params: { workshopId, studyId }, body }),
    onSuccess: (revision) => {
      client.setQueryData(revisionQuery(workshopId, studyId, revision.number).queryKey, revision);
      return client.invalidateQueries({ queryKey: studiesKey(workshopId) });
    },
  });
}
