import {
  type CreateStudyRequest,
  type RenameStudyRequest,
  type SaveEditsRequest,
  studyRoutes,
} from "@linkwright/contract";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { callApi } from "./client.ts";

export const studiesKey = (workshopId: string) => ["workshops", workshopId, "studies"] as const;

export const studiesQuery = (workshopId: string, buildId: string) =>
  queryOptions({
    queryKey: [...studiesKey(workshopId), "of", buildId],
    queryFn: ({ signal }) => callApi(studyRoutes.list, { params: { workshopId, buildId }, signal }),
    select: ({ studies }) => studies,
  });

export const studyQuery = (workshopId: string, studyId: string) =>
  queryOptions({
    queryKey: [...studiesKey(workshopId), studyId],
    queryFn: ({ signal }) => callApi(studyRoutes.get, { params: { workshopId, studyId }, signal }),
  });

export function useCreateStudy(workshopId: string, buildId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CreateStudyRequest) =>
      callApi(studyRoutes.create, { params: { workshopId, buildId }, body }),
    onSuccess: (study) => {
      client.setQueryData(studyQuery(workshopId, study.id).queryKey, study);
      return client.invalidateQueries({ queryKey: ["workshops", workshopId] });
    },
  });
}

export function useRenameStudy(workshopId: string, studyId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: RenameStudyRequest) =>
      callApi(studyRoutes.rename, { params: { workshopId, studyId }, body }),
    onSuccess: () => client.invalidateQueries({ queryKey: studiesKey(workshopId) }),
  });
}

/** Sent by the open study itself, which keeps what is not yet acknowledged. */
export function saveEdits(workshopId: string, studyId: string, body: SaveEditsRequest) {
  return callApi(studyRoutes.saveEdits, { params: { workshopId, studyId }, body });
}

/** Past every cache: what stands on the server at this moment. */
export function fetchStudy(workshopId: string, studyId: string) {
  return callApi(studyRoutes.get, { params: { workshopId, studyId } });
}
