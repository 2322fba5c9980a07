// The workshop is the tenant: everything else hangs below it.

import { z } from "zod";
import { Id, Role, Timestamp } from "./primitives.ts";
import { defineRoute, NoBody } from "./route.ts";

export const WorkshopParams = z.strictObject({ workshopId: Id });

export const Member = z.object({
  personId: Id,
  name: z.string(),
  email: z.string(),
  role: Role,
  joinedAt: Timestamp,
});
export type Member = z.infer<typeof Member>;

export const MemberList = z.object({ members: z.array(Member) });
export type MemberList = z.infer<typeof MemberList>;

export const workshopRoutes = {
  members: defineRoute({
    method: "GET",
    path: "/api/workshops/:workshopId/members",
    access: "workshop.read",
    params: WorkshopParams,
    body: NoBody,
    answer: MemberList,
    status: 200,
  }),
} as const;
