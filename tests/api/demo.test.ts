// The demo seed: an invented shop whose studies each show what they are there to show.

import {
  authRoutes,
  buildRoutes,
  commentRoutes,
  revisionRoutes,
  type Study,
  studyRoutes,
} from "@linkwright/contract";
import { DEMO_ACCOUNTS, hashDocument, seedDemo } from "@linkwright/db";
import {
  bumpSteerCurves,
  checkStudy,
  findFaults,
  listHardpoints,
  type RideHeight,
  worseOf,
} from "@linkwright/kinematics";
import { beforeAll, describe, expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import type { Client } from "./support/client.ts";
import { asOwner } from "./support/owner.ts";
import { signIn } from "./support/shop.ts";

const api = serveApi();
let client: Client;
let workshopId: string;
/** By name. */
let studies: Map<string, { id: string; draft: Study }>;

beforeAll(async () => {
  await seedDemo(api().connection.db);
  const engineer = DEMO_ACCOUNTS.find(({ role }) => role === "engineer")!;
  client = await signIn(api(), engineer.email, engineer.password);
  const me = await client.call(authRoutes.me, {});
  workshopId = me.memberships[0]!.workshopId;
  const { builds } = await client.call(buildRoutes.list, { workshopId });
  const lists = await Promise.all(
    builds.map((build) => client.call(studyRoutes.list, { workshopId, buildId: build.id })),
  );
  const all = await Promise.all(
    lists
      .flatMap((list) => list.studies)
      .map(({ id }) => client.call(studyRoutes.get, { workshopId, studyId: id })),
  );
  studies = new Map(all.map(({ id, name, draft }) => [name, { id, draft }]));
});

const studyNamed = (name: string): Study => studies.get(name)!.draft;

/** The worst bump steer of either side over a ride height's band, degrees. */
function worstBumpSteerDeg(study: Study, height: RideHeight): number {
  const curves = bumpSteerCurves(study.axle, height, 5);
  expect(curves.map(({ reached }) => reached)).toEqual([height.band, height.band]);
  return worseOf(curves)!.maxDeg;
}

test("has an account for each role that signs in with the printed password", async () => {
  expect(DEMO_ACCOUNTS.map(({ role }) => role).sort()).toEqual([
    "engineer",
    "fabricator",
    "owner",
    "reviewer",
  ]);
  for (const { email, password, role, workshop } of DEMO_ACCOUNTS) {
    expect(email).toMatch(/@example\.org$/);
    const me = await (await signIn(api(), email, password)).call(authRoutes.me, {});
    expect(me.memberships).toEqual([{ workshopId, workshopName: workshop, role }]);
  }
});

test("is seeded once: a second run changes nothing, not even what people have changed", async () => {
  const { builds } = await client.call(buildRoutes.list, { workshopId });
  const params = { workshopId, buildId: builds[0]!.id };
  await client.call(buildRoutes.rename, params, { name: "Renamed by a visitor" });
  const snapshot = () => asOwner(api(), "select * from builds order by id");
  const before = await snapshot();
  expect(await seedDemo(api().connection.db)).toEqual(DEMO_ACCOUNTS);
  expect(await snapshot()).toEqual(before);
});

test("has two builds and five studies that the engine accepts, each with a revision of what it holds and comments", async () => {
  expect((await client.call(buildRoutes.list, { workshopId })).builds).toHaveLength(2);
  expect(studies.size).toBe(5);
  for (const { id, draft } of studies.values()) {
    expect(checkStudy(draft)).toEqual([]);
    const params = { workshopId, studyId: id };
    const revision = await client.call(revisionRoutes.get, { ...params, number: 1 });
    expect(revision.study).toEqual(draft);
    expect(revision.hash).toBe(hashDocument(draft));
    const { comments } = await client.call(commentRoutes.list, params);
    expect(comments.length).toBeGreaterThan(0);
    const paths = listHardpoints(draft.axle).map(({ path }) => path);
    for (const { pin } of comments) if (pin.type === "hardpoint") expect(paths).toContain(pin.path);
  }
});

test("every front axle has two ride heights", () => {
  const fronts = [...studies.values()].filter(({ draft }) => draft.axle.position === "front");
  expect(fronts).toHaveLength(4);
  for (const { draft } of fronts) expect(draft.rideHeights).toHaveLength(2);
});

describe("the studies show something", () => {
  test("the front axle as drawn steers itself by far more than its target, at both heights", () => {
    const study = studyNamed("Front axle, as first drawn");
    for (const height of study.rideHeights) expect(worstBumpSteerDeg(study, height)).toBeGreaterThan(1.5);
  });

  test("the same one with the rack lowered is within a third of it, at both heights, and only its tie rod moved", () => {
    const [drawn, cured] = [studyNamed("Front axle, as first drawn"), studyNamed("Front axle, rack lowered")];
    const target = cured.targets.find(({ quantity }) => quantity === "bumpSteerDeg")!.max!;
    for (const height of cured.rideHeights) expect(worstBumpSteerDeg(cured, height)).toBeLessThan(target / 3);
    const { tieRod } = drawn.axle.left;
    expect({ ...cured.axle, left: { ...cured.axle.left, tieRod } }).toEqual(drawn.axle);
  });

  test("the rear axle has a fixed toe link and is past its target in droop only", () => {
    const study = studyNamed("Rear axle, fixed toe link");
    expect(study.axle).toMatchObject({ position: "rear", steering: { type: "fixed" } });
    expect(worstBumpSteerDeg(study, study.rideHeights[0]!)).toBeGreaterThan(0.15);
    expect(worstBumpSteerDeg(study, { ...study.rideHeights[0]!, band: [-25, 50] })).toBeLessThan(0.15);
  });

  test("the van's sides came out unequal", () => {
    const { axle, rideHeights } = studyNamed("Front axle, as welded");
    expect(axle.right).not.toBe("mirror");
    const [left, right] = bumpSteerCurves(axle, rideHeights[1]!, 5).map(
      ({ bumpSteerDeg }) => bumpSteerDeg.at(-1)!,
    );
    expect(Math.abs(left! - right!)).toBeGreaterThan(0.1);
  });

  test("the turned rack steers backwards, and no other study does", () => {
    const backwards = [...studies].filter(([, { draft }]) =>
      findFaults(draft.axle, draft.rideHeights).some(({ kind }) => kind === "steersBackwards"),
    );
    expect(backwards.map(([name]) => name)).toEqual(["Front axle, rack turned round"]);
  });
});
