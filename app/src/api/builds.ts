import { buildRoutes, type CreateBuildRequest, type RenameBuildRequest } from "@linkwright/contract";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { callApi } from "./client.ts";

const buildsKey = (workshopId: string) => ["workshops", workshopId, "builds"] as const;

export const buildsQuery = (workshopId: string) =>
  queryOptions({
    queryKey: [...buildsKey(workshopId), "list"],
    queryFn: ({ signal }) => callApi(buildRoutes.list, { params: { workshopId }, signal }),
    select: ({ builds }) => builds,
  });

export const buildQuery = (workshopId: string, buildId: string) =>
  queryOptions({
    queryKey: [...buildsKey(workshopId), buildId],
    queryFn: ({ signal }) => callApi(buildRoutes.get, { params: { workshopId, buildId }, signal }),
  });

export function useCreateBuild(workshopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CreateBuildRequest) => callApi(buildRoutes.create, { params: { workshopId }, body }),
    onSuccess: (build) => {
      client.setQueryData(buildQuery(workshopId, build.id).queryKey, build);
      return client.invalidateQueries({ queryKey: buildsQuery(workshopId).queryKey });
    },
  });
}

export function useRenameBuild(workshopId: string, buildId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: RenameBuildRequest) =>
      callApi(buildRoutes.rename, { params: { workshopId, buildId }, body }),
    onSuccess: () => client.invalidateQueries({ queryKey: buildsKey(workshopId) }),
  });
}
