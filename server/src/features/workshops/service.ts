import type { MemberList } from "@linkwright/contract";
import type { WorkshopScope } from "@linkwright/db";
import * as repo from "./repo.ts";

export async function listMembers(scope: WorkshopScope): Promise<MemberList> {
  const rows = await repo.listMembers(scope);
  return { members: rows.map((row) => ({ ...row, joinedAt: row.joinedAt.toISOString() })) };
}
