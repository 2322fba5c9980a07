// A workshop with one person of each role, all of them signed in.

import { randomUUID } from "node:crypto";
import { authRoutes, type Role } from "@linkwright/contract";
import { inWorkshop, memberships, people, workshops } from "@linkwright/db";
import type { TestApi } from "./api.ts";
import { type Client, createClient } from "./client.ts";

export const PASSWORD = "correct horse battery";
/** argon2id of PASSWORD at the least cost there is: the tests sign in often and are after other things. */
const CHEAP_HASH =
  "$argon2id$v=19$m=256,t=1,p=1$LaJPtVp2dOT92xa8oEX4Ug$E9okD5/krfAqOzek3WsJWyAVna8OdGn4mM40ZSXzXD0";

export interface Person {
  readonly id: string;
  readonly name: string;
  readonly email: string;
}

export interface Member extends Person {
  readonly client: Client;
}

export interface Shop {
  readonly id: string;
  readonly name: string;
  readonly members: Readonly<Record<Role, Member>>;
}

const ROLES: readonly Role[] = ["owner", "engineer", "fabricator", "reviewer"];

export async function buildShop(api: TestApi, name = "Test shop"): Promise<Shop> {
  const workshopId = randomUUID();
  const staff = ROLES.map((role) => ({ role, ...newPerson(role) }));
  await inWorkshop(api.connection.db, workshopId, async ({ tx }) => {
    await tx.insert(workshops).values({ id: workshopId, name });
    await tx.insert(people).values(
      staff.map(({ role: _, ...person }) => ({
        ...person,
        passwordHash: CHEAP_HASH,
        cautionsAcknowledgedAt: new Date(0),
        cautionsEdition: 1,
      })),
    );
    await tx
      .insert(memberships)
      .values(staff.map(({ role, id: personId }) => ({ workshopId, personId, role })));
  });
  const members = await Promise.all(
    staff.map(
      async ({ role, ...person }) => [role, { ...person, client: await signIn(api, person.email) }] as const,
    ),
  );
  return { id: workshopId, name, members: Object.fromEntries(members) as Shop["members"] };
}

/** A signed-in browser. */
export async function signIn(api: TestApi, email: string, password = PASSWORD): Promise<Client> {
  const client = createClient(api.url);
  await client.call(authRoutes.signIn, {}, { email, password });
  return client;
}

/** Makes the person of one workshop a member of another one too. */
export async function join(api: TestApi, workshopId: string, personId: string, role: Role): Promise<void> {
  await inWorkshop(api.connection.db, workshopId, async ({ tx }) => {
    await tx.insert(memberships).values({ workshopId, personId, role });
  });
}

function newPerson(role: Role): Person {
  const id = randomUUID();
  return { id, name: `The ${role}`, email: `${role}-${id}@example.org` };
}
