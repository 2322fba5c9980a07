// Writes the demo into a database, once: what people have since changed or removed in it stays as they left it.

import { createHash } from "node:crypto";
import { CAUTIONS_EDITION, type Role } from "@linkwright/contract";
import { type Db, inWorkshop, type WorkshopScope } from "../client.ts";
import { hashDocument } from "../hashDocument.ts";
import { builds, comments, memberships, people, revisions, studies, workshops } from "../schema/index.ts";
import {
  DEMO_BUILDS,
  DEMO_PASSWORD,
  DEMO_PASSWORD_HASH,
  DEMO_PEOPLE,
  DEMO_WORKSHOP,
  type DemoBuild,
  type DemoComment,
  type DemoStudy,
} from "./demo.ts";

export interface DemoAccount {
  readonly email: string;
  readonly password: string;
  readonly role: Role;
  readonly name: string;
  readonly workshop: string;
}

export const DEMO_ACCOUNTS: readonly DemoAccount[] = DEMO_PEOPLE.map(({ email, role, name }) => ({
  email,
  password: DEMO_PASSWORD,
  role,
  name,
  workshop: DEMO_WORKSHOP,
}));

/** The first thing in the demo was made then, and each further thing an hour later, so that lists have their order. */
const BEGAN = Date.UTC(2026, 10, 16, 8);
const HOUR_MS = 60 * 60 * 1000;

/** Idempotent. Works as the application's role: it needs no right that the programs do not have. */
export async function seedDemo(db: Db): Promise<readonly DemoAccount[]> {
  await inWorkshop(db, demoId("workshop"), async (scope) => {
    const { tx, workshopId: id } = scope;
    const added = await tx
      .insert(workshops)
      .values({ id, name: DEMO_WORKSHOP, createdAt: new Date(BEGAN) })
      .onConflictDoNothing()
      .returning({ id: workshops.id });
    if (added.length === 0) return;
    await addPeople(scope);
    const clock = createClock();
    for (const build of DEMO_BUILDS) await addBuild(scope, clock, build);
  });
  return DEMO_ACCOUNTS;
}

type Clock = () => Date;

function createClock(): Clock {
  let at = BEGAN;
  return () => {
    at += HOUR_MS;
    return new Date(at);
  };
}

async function addPeople({ tx, workshopId }: WorkshopScope): Promise<void> {
  const at = new Date(BEGAN);
  await tx.insert(people).values(
    DEMO_PEOPLE.map(({ email, name, role }) => ({
      id: personId(role),
      email,
      name,
      passwordHash: DEMO_PASSWORD_HASH,
      cautionsAcknowledgedAt: at,
      cautionsEdition: CAUTIONS_EDITION,
      createdAt: at,
    })),
  );
  await tx
    .insert(memberships)
    .values(DEMO_PEOPLE.map(({ role }) => ({ workshopId, personId: personId(role), role, createdAt: at })));
}

async function addBuild(scope: WorkshopScope, clock: Clock, build: DemoBuild): Promise<void> {
  const { tx, workshopId } = scope;
  const id = demoId(`build ${build.name}`);
  const at = clock();
  await tx.insert(builds).values({
    workshopId,
    id,
    name: build.name,
    summary: build.summary,
    createdBy: personId("owner"),
    createdAt: at,
    updatedAt: at,
  });
  for (const study of build.studies) await addStudy(scope, clock, id, study);
}

async function addStudy(scope: WorkshopScope, clock: Clock, buildId: string, demo: DemoStudy): Promise<void> {
  const { tx, workshopId } = scope;
  const id = demoId(`study ${demo.name}`);
  const by = personId("engineer");
  const at = clock();
  const { study } = demo;
  await tx.insert(studies).values({
    workshopId,
    id,
    buildId,
    name: demo.name,
    draft: study,
    draftFormat: study.format,
    createdBy: by,
    createdAt: at,
    updatedBy: by,
    updatedAt: at,
  });
  await tx.insert(revisions).values({
    workshopId,
    id: demoId(`revision ${demo.name}`),
    studyId: id,
    number: 1,
    version: 1,
    study,
    studyFormat: study.format,
    hash: hashDocument(study),
    note: demo.revisionNote,
    createdBy: by,
    createdAt: clock(),
  });
  for (const [index, comment] of demo.comments.entries()) {
    await addComment(scope, clock, id, demoId(`comment ${index} ${demo.name}`), comment);
  }
}

async function addComment(
  { tx, workshopId }: WorkshopScope,
  clock: Clock,
  studyId: string,
  id: string,
  comment: DemoComment,
): Promise<void> {
  await tx.insert(comments).values({
    workshopId,
    id,
    studyId,
    revisionNumber: 1,
    pin: comment.hardpoint === undefined ? "study" : "hardpoint",
    hardpointPath: comment.hardpoint ?? null,
    text: comment.text,
    createdBy: personId(comment.by),
    createdAt: clock(),
    ...(comment.isResolved && { resolvedBy: personId("engineer"), resolvedAt: clock() }),
  });
}

function personId(role: Role): string {
  return demoId(`person ${role}`);
}

/** The same id for the same name every time: a UUID of version 8, whose bits are ours to choose. */
function demoId(name: string): string {
  const hex = createHash("sha256").update(`linkwright demo: ${name}`).digest("hex");
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-8${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}
