import { type CreateCommentRequest, commentRoutes } from "@linkwright/contract";
import { queryOptions, useMutation, useQueryClient } from "@tanstack/react-query";
import { callApi } from "./client.ts";
import { studiesKey } from "./studies.ts";

export const commentsQuery = (workshopId: string, studyId: string) =>
  queryOptions({
    queryKey: [...studiesKey(workshopId), studyId, "comments"],
    queryFn: ({ signal }) => callApi(commentRoutes.list, { params: { workshopId, studyId }, signal }),
    select: ({ comments }) => comments,
  });

export function useAddComment(workshopId: string, studyId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: CreateCommentRequest) =>
      callApi(commentRoutes.create, { params: { workshopId, studyId }, body }),
    onSuccess: () => client.invalidateQueries({ queryKey: studiesKey(workshopId) }),
  });
}

interface Settling {
  readonly commentId: string;
  readonly resolved: boolean;
}

export function useSettleComment(workshopId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ commentId, resolved }: Settling) =>
      callApi(commentRoutes.settle, { params: { workshopId, commentId }, body: { resolved } }),
    onSuccess: () => client.invalidateQueries({ queryKey: studiesKey(workshopId) }),
  });
}
