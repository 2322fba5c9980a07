// Saving a draft when others save too: what merges, what is a conflict, and that nothing typed is ever lost.

import { randomUUID } from "node:crypto";
import { type Edit, type SaveEditsRequest, type Study, studyRoutes } from "@linkwright/contract";
import { rightCorner } from "@linkwright/kinematics";
import { beforeAll, beforeEach, describe, expect, test } from "vitest";
import { serveApi } from "./support/api.ts";
import type { Client } from "./support/client.ts";
import { buildShop, type Shop } from "./support/shop.ts";
import { type BuildAndStudy, buildStudy, plainStudy } from "./support/work.ts";

const api = serveApi();
let shop: Shop;
let engineer: Client;
let owner: Client;
let work: BuildAndStudy;

beforeAll(async () => {
  shop = await buildShop(api());
  engineer = shop.members.engineer.client;
  owner = shop.members.owner.client;
});

beforeEach(async () => {
  work = await buildStudy(shop);
});

const { axle } = plainStudy;
const { tieRod } = axle.left;
const INNER = ["axle", "left", "tieRod", "inner"];
const OUTER = ["axle", "left", "tieRod", "outer"];
const raised = (point: readonly number[], by: number) => [point[0]!, point[1]!, point[2]! + by];
const moveInner = (by: number, from: readonly number[] = tieRod.inner): Edit => ({
  path: INNER,
  from: [...from],
  to: raised(from, by),
});
const moveOuter = (by: number): Edit => ({
  path: OUTER,
  from: [...tieRod.outer],
  to: raised(tieRod.outer, by),
});

function saveRequest(baseVersion: number, ...edits: Edit[]): SaveEditsRequest {
  return { id: randomUUID(), baseVersion, edits };
}

const save = (client: Client, request: SaveEditsRequest) =>
  client.call(studyRoutes.saveEdits, work.params, request);
const refused = (client: Client, request: unknown) =>
  client.refused(studyRoutes.saveEdits, work.params, request);
const read = () => engineer.call(studyRoutes.get, work.params);

describe("a save on the newest version", () => {
  test("changes what it names, leaves the rest, and counts the version up", async () => {
    const saved = await save(
      engineer,
      saveRequest(1, moveInner(3), { path: ["axle", "name"], from: axle.name, to: "B" }),
    );
    const expected: Study = {
      ...plainStudy,
      axle: {
        ...axle,
        name: "B",
        left: {
          ...axle.left,
          tieRod: { ...tieRod, inner: raised(tieRod.inner, 3) as [number, number, number] },
        },
      },
    };
    expect(saved).toEqual({ version: 2, draft: expected });
    const study = await read();
    expect({ version: study.version, draft: study.draft }).toEqual(saved);
    expect(study.updatedBy.id).toBe(shop.members.engineer.id);
  });

  test("adds and removes an optional member, and replaces a whole list", async () => {
    const rim = { diameter: 381, width: 152, offset: 15 };
    const heights = [{ name: "Only", wheelUp: 5, rakeDeg: 0, band: [-20, 20] }];
    const added = await save(
      engineer,
      saveRequest(
        1,
        { path: ["axle", "left", "wheel", "rim"], to: rim },
        { path: ["rideHeights"], from: plainStudy.rideHeights as never, to: heights },
      ),
    );
    expect(added.draft.axle.left.wheel.rim).toEqual(rim);
    expect(added.draft.rideHeights).toEqual(heights);
    const removed = await save(
      engineer,
      saveRequest(2, { path: ["axle", "left", "wheel", "rim"], from: rim }),
    );
    expect(removed.draft.axle).toEqual(axle);
  });

  test("may change the same place twice in one go, as undo and redo do", async () => {
    const twice = [moveInner(3), moveInner(2, raised(tieRod.inner, 3))];
    const { draft } = await save(engineer, saveRequest(1, ...twice));
    expect(draft.axle.left.tieRod.inner).toEqual(raised(tieRod.inner, 5));
  });
});

describe("two people at once", () => {
  test("both get their way when they change different points", async () => {
    await save(owner, saveRequest(1, moveOuter(-2)));
    const saved = await save(engineer, saveRequest(1, moveInner(3)));
    expect(saved.version).toBe(3);
    expect(saved.draft.axle.left.tieRod).toEqual({
      inner: raised(tieRod.inner, 3),
      outer: raised(tieRod.outer, -2),
    });
  });

  test("who comes second to the same point is told both values, and nothing is changed", async () => {
    await save(owner, saveRequest(1, moveInner(-4)));
    const before = await read();
    const problem = await refused(engineer, saveRequest(1, moveOuter(1), moveInner(3)));
    expect(problem.code).toBe("edit_conflict");
    expect(problem.conflict).toEqual({
      version: 2,
      edits: [
        {
          path: INNER,
          base: tieRod.inner,
          theirs: raised(tieRod.inner, -4),
          yours: raised(tieRod.inner, 3),
          changedBy: { id: shop.members.owner.id, name: shop.members.owner.name },
          changedAt: before.updatedAt,
        },
      ],
    });
    expect(await read()).toEqual(before);
  });

  test("the person's choice is then saved on the new version, with the edits that were never in dispute", async () => {
    await save(owner, saveRequest(1, moveInner(-4)));
    const { conflict } = await refused(engineer, saveRequest(1, moveOuter(1), moveInner(3)));
    const [dispute] = conflict!.edits;
    const mine: Edit = { path: dispute!.path, from: dispute!.theirs, to: dispute!.yours };
    const saved = await save(engineer, saveRequest(conflict!.version, moveOuter(1), mine));
    expect(saved.draft.axle.left.tieRod).toEqual({
      inner: raised(tieRod.inner, 3),
      outer: raised(tieRod.outer, 1),
    });
  });

  test("agree when both give the point the same value", async () => {
    await save(owner, saveRequest(1, moveInner(3)));
    const saved = await save(engineer, saveRequest(1, moveInner(3)));
    expect(saved.draft.axle.left.tieRod.inner).toEqual(raised(tieRod.inner, 3));
  });

  test("are not in conflict when one has put the point back where it was", async () => {
    await save(owner, saveRequest(1, moveInner(3)));
    await save(owner, saveRequest(2, { path: INNER, from: raised(tieRod.inner, 3), to: [...tieRod.inner] }));
    const saved = await save(engineer, saveRequest(1, moveInner(-1)));
    expect(saved.draft.axle.left.tieRod.inner).toEqual(raised(tieRod.inner, -1));
  });

  test("are in conflict when one replaces the whole that the other edits within", async () => {
    const [road, track] = plainStudy.rideHeights;
    const swapped = [track, road];
    await save(
      owner,
      saveRequest(1, { path: ["rideHeights"], from: [road, track] as never, to: swapped as never }),
    );
    // Both heights have rakeDeg 0: by value alone the edit would fit, and land on the wrong ride height.
    const edit: Edit = { path: ["rideHeights", 0, "rakeDeg"], from: 0, to: 0.5 };
    const problem = await refused(engineer, saveRequest(1, edit));
    expect(problem.conflict!.edits).toMatchObject([{ path: edit.path, theirs: 0, yours: 0.5 }]);
  });

  test("are in conflict when one removes what the other edits", async () => {
    const spring = axle.left.spring!;
    await save(owner, saveRequest(1, { path: ["axle", "left", "spring"], from: spring as never }));
    const edit: Edit = { path: ["axle", "left", "spring", "on"], from: "lowerArm", to: "knuckle" };
    const { conflict } = await refused(engineer, saveRequest(1, edit));
    expect(conflict!.edits).toHaveLength(1);
    expect(conflict!.edits[0]).not.toHaveProperty("theirs");
    expect(conflict!.edits[0]).toMatchObject({ base: "lowerArm", yours: "knuckle" });
  });

  test("saving at the very same moment both come through, one after the other", async () => {
    const both = await Promise.all([
      save(owner, saveRequest(1, moveOuter(-2))),
      save(engineer, saveRequest(1, moveInner(3))),
    ]);
    expect(both.map(({ version }) => version).sort()).toEqual([2, 3]);
    const { draft } = await read();
    expect(draft.axle.left.tieRod).toEqual({
      inner: raised(tieRod.inner, 3),
      outer: raised(tieRod.outer, -2),
    });
  });

  test("a merge that is impossible as a whole is refused, though each half was possible", async () => {
    // Each alone leaves the joints of the tie rod 314 mm apart; together they would meet.
    const toMiddle: Edit = { path: INNER, from: [...tieRod.inner], to: [120, 420, 216] };
    await save(owner, saveRequest(1, toMiddle));
    const onTop: Edit = { path: OUTER, from: [...tieRod.outer], to: [120, 420, 216] };
    const before = await read();
    const problem = await refused(engineer, saveRequest(1, onTop));
    expect(problem.code).toBe("study_refused");
    expect(problem.issues![0]!.path.join(".")).toContain("tieRod");
    expect(await read()).toEqual(before);
  });
});

describe("a save sent again", () => {
  test("changes nothing and answers the same, even when others have saved since", async () => {
    const request = saveRequest(1, moveInner(3), {
      path: ["axle", "left", "wheel", "rim"],
      to: { diameter: 381, width: 152, offset: 15 },
    });
    const first = await save(engineer, request);
    await save(owner, saveRequest(2, moveInner(-9, raised(tieRod.inner, 3)), moveOuter(2)));
    await save(
      owner,
      saveRequest(3, {
        path: ["axle", "left", "wheel", "rim"],
        from: first.draft.axle.left.wheel.rim! as never,
      }),
    );
    expect(await save(engineer, request)).toEqual(first);
    expect((await read()).version).toBe(4);
  });

  test("at the same moment is one save", async () => {
    const request = saveRequest(1, moveInner(3));
    const answers = await Promise.all([
      save(engineer, request),
      save(engineer, request),
      save(engineer, request),
    ]);
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1);
    expect((await read()).version).toBe(2);
  });

  test("under the same id but with other edits, or by another person, is refused", async () => {
    const request = saveRequest(1, moveInner(3));
    await save(engineer, request);
    expect((await refused(engineer, { ...request, edits: [moveOuter(1)] })).code).toBe("id_reused");
    expect((await refused(owner, request)).code).toBe("id_reused");
    const other = await buildStudy(shop);
    const elsewhere = await engineer.refused(studyRoutes.saveEdits, other.params, request);
    expect(elsewhere.code).toBe("id_reused");
  });
});

describe("a save that cannot be", () => {
  test.each<[string, Edit, string]>([
    ["half of a point", { path: [...INNER, 2], from: tieRod.inner[2], to: 220 }, "whole"],
    ["half of a band", { path: ["rideHeights", 0, "band", 0], from: -40, to: -30 }, "whole"],
    [
      "an entry past the end of a list",
      { path: ["targets", 1], to: { quantity: "track", min: 1, max: null } },
      "entry",
    ],
    ["an entry taken out of a list", { path: ["targets", 0], from: plainStudy.targets[0] as never }, "list"],
    ["a place that is not there", { path: ["axle", "left", "antiRollBar", "arm"], to: [0, 0, 0] }, "nothing"],
    ["a number for a member", { path: ["axle", 0], to: 1 }, "number"],
  ])("%s is refused with its path", async (_name, edit, word) => {
    const { code, issues } = await refused(engineer, saveRequest(1, edit));
    expect(code).toBe("invalid");
    expect(issues!.map(({ path }) => path)).toEqual([edit.path]);
    expect(issues![0]!.problem).toContain(word);
  });

  test.each<[string, Edit, readonly (string | number)[]]>([
    ["an unknown member", { path: ["axle", "left", "colour"], to: "red" }, ["axle", "left", "colour"]],
    ["a prototype", { path: ["axle", "__proto__"], to: { name: "x" } }, ["axle", "__proto__"]],
    ["text for a number", { path: ["axle", "wheelbase"], from: 2500, to: "2500" }, ["axle", "wheelbase"]],
    ["a required member removed", { path: ["axle", "wheelbase"], from: 2500 }, ["axle", "wheelbase"]],
    ["a joint six metres away", { path: INNER, from: [...tieRod.inner], to: [128, 6000, 214] }, INNER],
    [
      "a right side on the left",
      { path: ["axle", "right"], from: "mirror", to: axle.left as never },
      ["axle", "right", "wheel", "centre"],
    ],
  ])("%s is refused as the study that it would be, and the draft stays", async (_name, edit, path) => {
    const before = await read();
    const { code, issues } = await refused(engineer, saveRequest(1, edit));
    expect(code).toBe("study_refused");
    expect(issues!.map((issue) => issue.path)).toContainEqual(path);
    expect(await read()).toEqual(before);
  });

  test("on a version that is yet to come is refused", async () => {
    const { issues } = await refused(engineer, saveRequest(9, moveInner(1)));
    expect(issues!.map(({ path }) => path)).toEqual([["baseVersion"]]);
  });

  test("with a from that never stood there is a conflict that names nobody", async () => {
    const { conflict } = await refused(engineer, saveRequest(1, moveInner(1, [0, 0, 0])));
    expect(conflict!.edits).toMatchObject([{ theirs: tieRod.inner, changedBy: null, changedAt: null }]);
  });

  test.each([
    ["no edits", { edits: [] }, ["edits"]],
    ["an empty path", { edits: [{ path: [], to: 1 }] }, ["edits", 0, "path"]],
    ["an unknown member", { edits: [{ path: ["axle"], to: 1, force: true }] }, ["edits", 0, "force"]],
    ["a version that is none", { baseVersion: 0 }, ["baseVersion"]],
  ])("with %s is refused at the door", async (_name, change, path) => {
    const { code, issues } = await refused(engineer, { ...saveRequest(1, moveInner(1)), ...change });
    expect(code).toBe("invalid");
    expect(issues!.map((issue) => issue.path)).toContainEqual(path);
  });
});

describe("studies", () => {
  test("a copy starts from the draft of the other and then goes its own way", async () => {
    await save(engineer, saveRequest(1, moveInner(3)));
    const id = randomUUID();
    const build = { workshopId: shop.id, buildId: work.buildId };
    const request = { id, name: "Variant", source: { type: "copy", studyId: work.studyId } } as const;
    const copy = await engineer.call(studyRoutes.create, build, request);
    expect(copy.draft).toEqual((await read()).draft);
    expect(copy.version).toBe(1);
    const params = { workshopId: shop.id, studyId: id };
    await engineer.call(studyRoutes.saveEdits, params, saveRequest(1, moveOuter(2)));
    expect((await read()).draft.axle.left.tieRod.outer).toEqual(tieRod.outer);
    expect(await engineer.call(studyRoutes.create, build, request)).toMatchObject({ id, version: 2 });
  });

  test("a mirrored side given in full is the same axle", async () => {
    const full = { path: ["axle", "right"], from: "mirror", to: rightCorner(axle) as never };
    const { draft } = await save(engineer, saveRequest(1, full));
    expect(draft.axle.right).toEqual(rightCorner(axle));
  });

  test("an impossible document is refused with the path inside the request", async () => {
    const study = {
      ...plainStudy,
      axle: { ...axle, left: { ...axle.left, tieRod: { ...tieRod, outer: tieRod.inner } } },
    };
    const body = { id: randomUUID(), name: "Nothing", source: { type: "document", study } };
    const build = { workshopId: shop.id, buildId: work.buildId };
    const { code, issues } = await engineer.refused(studyRoutes.create, build, body);
    expect(code).toBe("study_refused");
    expect(issues![0]!.path.slice(0, 2)).toEqual(["source", "study"]);
  });

  test("a copy of nothing is refused", async () => {
    const body = { id: randomUUID(), name: "Nothing", source: { type: "copy", studyId: randomUUID() } };
    const build = { workshopId: shop.id, buildId: work.buildId };
    const { issues } = await engineer.refused(studyRoutes.create, build, body);
    expect(issues!.map(({ path }) => path)).toEqual([["source", "studyId"]]);
  });

  test("the list of a build shows each with its side and its counts", async () => {
    const build = { workshopId: shop.id, buildId: work.buildId };
    const { studies } = await shop.members.reviewer.client.call(studyRoutes.list, build);
    expect(studies).toMatchObject([
      {
        id: work.studyId,
        name: "Front axle",
        position: "front",
        version: 1,
        latestRevision: null,
        openComments: 0,
      },
    ]);
    expect(studies[0]).not.toHaveProperty("draft");
  });
});
