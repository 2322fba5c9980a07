import { workshopRoutes } from "@linkwright/contract";
import { queryOptions } from "@tanstack/react-query";
import { callApi } from "./client.ts";

export const membersQuery = (workshopId: string) =>
  queryOptions({
    queryKey: ["workshops", workshopId, "members"],
    queryFn: ({ signal }) => callApi(workshopRoutes.members, { params: { workshopId }, signal }),
    select: ({ members }) => members,
  });
