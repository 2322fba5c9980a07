// The hardpoint table from the asking to the download: queue, worker, object store, server, all of them real.

import { randomUUID } from "node:crypto";
import {
  CAUTIONS,
  pathTo,
  revisionRoutes,
  type Sheet,
  type Study,
  sheetRoutes,
  shortHash,
  studyRoutes,
} from "@linkwright/contract";
import { inWorkshop, sheets } from "@linkwright/db";
import { type Coordinates, listHardpoints } from "@linkwright/kinematics";
import type { Storage } from "@linkwright/server/files";
import { startWorker, type Worker } from "@linkwright/server/jobs";
import { quietLog } from "@linkwright/server/log";
import { eq } from "drizzle-orm";
import Papa from "papaparse";
import { afterAll, beforeAll, describe, expect, test, vi } from "vitest";
import { MAIL_FROM, startApi, type TestApi } from "./support/api.ts";
import { problemOf } from "./support/client.ts";
import { type ObjectStore, startObjectStore } from "./support/fakes.ts";
import { asOwner } from "./support/owner.ts";
import { buildShop, type Shop } from "./support/shop.ts";
import { type BuildAndStudy, buildStudy, plainStudy, saveRevision } from "./support/work.ts";

let api: TestApi;
let store: ObjectStore;
let worker: Worker | undefined;
let shop: Shop;
/** What stands between the worker and the store; a test may put a fault there. */
let putFault: (() => Promise<void>) | null = null;

beforeAll(async () => {
  store = await startObjectStore();
  const storage: Storage = {
    ...store.storage,
    put: async (file) => {
      await putFault?.();
      await store.storage.put(file);
    },
  };
  api = await startApi({ storage });
  shop = await buildShop(api, "Quarry & Sons");
  worker = startWorker({
    connection: api.connection,
    databaseUrl: api.database.appUrl,
    storage,
    transport: { sendMail: () => Promise.reject(new Error("no mail in this file")) },
    mailFrom: MAIL_FROM,
    log: quietLog,
    pollMs: 50,
  });
});

afterAll(async () => {
  await worker?.stop();
  await api?.stop();
  await store?.stop();
});

type Units = Sheet["units"];
const sheetRequest = (units: Units = "mm", revision = 1) =>
  ({ id: randomUUID(), revision, kind: "hardpointTable", units }) as const;

async function finished(sheetId: string): Promise<Sheet> {
  const params = { workshopId: shop.id, sheetId };
  return vi.waitFor(
    async () => {
      const sheet = await shop.members.reviewer.client.call(sheetRoutes.get, params);
      expect(sheet.status).not.toBe("queued");
      return sheet;
    },
    { timeout: 20_000, interval: 50 },
  );
}

async function makeSheet(work: BuildAndStudy, units: Units = "mm"): Promise<Sheet> {
  const request = sheetRequest(units);
  await shop.members.fabricator.client.call(sheetRoutes.create, work.params, request);
  return finished(request.id);
}

function download(sheetId: string) {
  return shop.members.fabricator.client.send(
    "GET",
    pathTo(sheetRoutes.download, { workshopId: shop.id, sheetId }),
  );
}

async function revised(study: Study): Promise<BuildAndStudy> {
  const work = await buildStudy(shop, study);
  await saveRevision(shop, work);
  return work;
}

const rowsOf = (text: string) => Papa.parse<string[]>(text.replace(/^\uFEFF/, "")).data;
const labelled = (rows: readonly string[][], label: string) =>
  rows.find(([first]) => first === label)?.slice(1);

/** The table's points by "left Lower arm front pivot". */
function pointsOf(rows: readonly string[][]): Map<string, number[]> {
  const start = rows.findIndex(([first]) => first === "Side") + 1;
  const length = rows.slice(start).findIndex((row) => row.length < 6);
  return new Map(
    rows
      .slice(start, start + length)
      .map(([side, part, point, ...xyz]) => [`${side} ${part} ${point}`, xyz.map(Number)]),
  );
}

describe("a hardpoint table", () => {
  test("is made from the revision and downloads as a file", async () => {
    const work = await revised(plainStudy);
    const request = sheetRequest();
    const asked = await shop.members.fabricator.client.call(sheetRoutes.create, work.params, request);
    expect(asked).toMatchObject({
      id: request.id,
      status: "queued",
      revision: 1,
      fileName: null,
      byteSize: null,
    });
    const sheet = await finished(request.id);
    const reply = await download(sheet.id);
    expect(reply.status).toBe(200);
    expect(sheet).toMatchObject({
      status: "made",
      failure: null,
      fileName: "kit-one_front-axle_rev-1_mm_NOT-RELEASED.csv",
    });
    expect(reply.headers.get("content-type")).toBe("text/csv; charset=utf-8");
    expect(reply.headers.get("content-disposition")).toBe(`attachment; filename=${sheet.fileName}`);
    expect(reply.headers.get("x-content-type-options")).toBe("nosniff");
    expect(Number(reply.headers.get("content-length"))).toBe(sheet.byteSize);
    const { sheets: listed } = await shop.members.reviewer.client.call(sheetRoutes.list, work.params);
    expect(listed).toEqual([sheet]);
  });

  test("bears in its head what it is of, that it is not released, and at its foot the cautions", async () => {
    const work = await revised(plainStudy);
    const rows = rowsOf((await download((await makeSheet(work)).id)).text);
    const revision = await shop.members.reviewer.client.call(revisionRoutes.get, {
      ...work.params,
      number: 1,
    });
    expect(rows[1]![0]).toBe("NOT RELEASED");
    expect(labelled(rows, "Workshop")).toEqual(["Quarry & Sons"]);
    expect(labelled(rows, "Build")).toEqual(["Kit one"]);
    expect(labelled(rows, "Study")).toEqual(["Front axle"]);
    expect(labelled(rows, "Revision")).toEqual(["1"]);
    expect(labelled(rows, "Date")).toEqual([revision.createdAt.slice(0, 10)]);
    expect(labelled(rows, "Hash")).toEqual([shortHash(revision.hash)]);
    expect(labelled(rows, "Units")).toEqual(["mm"]);
    for (const { title, text } of CAUTIONS) expect(rows).toContainEqual([title, text]);
  });

  test("lists every hardpoint of both sides, to the digits it prints, in the car's own axes", async () => {
    const work = await revised(plainStudy);
    const points = pointsOf(rowsOf((await download((await makeSheet(work)).id)).text));
    const expected = listHardpoints(plainStudy.axle);
    expect(points.size).toBe(expected.length);
    for (const { side, group, label, point } of expected) {
      expect(points.get(`${side} ${group} ${label}`)).toEqual(point.map((value) => Number(value.toFixed(3))));
    }
    expect(points.get("right Lower arm ball joint")).toEqual([7, -580, 178]);
  });

  test("in inches is the millimetres divided by 25.4 exactly, to four places", async () => {
    const work = await revised(plainStudy);
    const rows = rowsOf((await download((await makeSheet(work, "inch")).id)).text);
    expect(labelled(rows, "Units")).toEqual(["inch"]);
    expect(rows).toContainEqual(["Side", "Part", "Point", "X (inch)", "Y (inch)", "Z (inch)"]);
    // 140, 260 and 190 mm, divided by hand.
    expect(pointsOf(rows).get("left Lower arm front pivot")).toEqual([5.5118, 10.2362, 7.4803]);
  });

  test("is in the study's datum when it has one", async () => {
    // The jig looks rearward from a pin: its x runs against the car's, so its y points right.
    const datum = { name: "Jig pin", origin: [200, 10, 100], xAxis: [-2, 0, 0], zAxis: [0, 0, 1] } as const;
    const work = await revised({ ...plainStudy, datum });
    const rows = rowsOf((await download((await makeSheet(work)).id)).text);
    expect(labelled(rows, "Datum")![0]).toBe("Jig pin");
    const inJig = ([x, y, z]: Coordinates) => [200 - x, 10 - y, z - 100];
    const points = pointsOf(rows);
    for (const { side, group, label, point } of listHardpoints(plainStudy.axle)) {
      expect(points.get(`${side} ${group} ${label}`)).toEqual(inJig(point));
    }
  });

  test("is of the revision, whatever the draft has become since", async () => {
    const work = await revised(plainStudy);
    const { tieRod } = plainStudy.axle.left;
    const edit = { path: ["axle", "left", "tieRod", "inner"], from: [...tieRod.inner], to: [128, 275, 200] };
    await shop.members.engineer.client.call(studyRoutes.saveEdits, work.params, {
      id: randomUUID(),
      baseVersion: 1,
      edits: [edit],
    });
    const points = pointsOf(rowsOf((await download((await makeSheet(work)).id)).text));
    expect(points.get("left Tie rod inner joint")).toEqual([...tieRod.inner]);
  });

  test("says nothing of NOT RELEASED once its revision is released", async () => {
    const work = await revised(plainStudy);
    await asOwner(api, "update revisions set status = 'released' where study_id = $1", [work.studyId]);
    const sheet = await makeSheet(work);
    const rows = rowsOf((await download(sheet.id)).text);
    expect(sheet.fileName).toBe("kit-one_front-axle_rev-1_mm.csv");
    expect(rows.flat().join(" ")).not.toMatch(/NOT RELEASED/);
    expect(labelled(rows, "Status")).toEqual(["released"]);
  });

  test("runs nothing in a spreadsheet: a name that begins like a formula is defused, a negative number is not", async () => {
    const name = '=HYPERLINK("http://elsewhere.example","click")';
    const work = await revised({ ...plainStudy, axle: { ...plainStudy.axle, name } });
    await shop.members.engineer.client.call(studyRoutes.rename, work.params, {
      name: "-2+3+cmd|' /C calc'!A0",
    });
    const text = (await download((await makeSheet(work)).id)).text;
    const cells = rowsOf(text).flat();
    expect(cells.filter((cell) => /^[=+@\t\r]|^-(?!\d+\.\d+$)/.test(cell))).toEqual([]);
    expect(labelled(rowsOf(text), "Study")).toEqual(["'-2+3+cmd|' /C calc'!A0"]);
    expect(pointsOf(rowsOf(text)).get("left Lower arm rear pivot")).toEqual([-105, 262, 184]);
  });
});

describe("asking for a sheet", () => {
  test("of a revision that is not there is refused", async () => {
    const work = await revised(plainStudy);
    const { issues } = await shop.members.fabricator.client.refused(
      sheetRoutes.create,
      work.params,
      sheetRequest("mm", 2),
    );
    expect(issues!.map(({ path }) => path)).toEqual([["revision"]]);
  });

  test("again under the same id makes one sheet and one job; for other units it is refused", async () => {
    const work = await revised(plainStudy);
    const request = sheetRequest();
    const { client } = shop.members.fabricator;
    await Promise.all([1, 2, 3].map(() => client.call(sheetRoutes.create, work.params, request)));
    await finished(request.id);
    expect((await client.call(sheetRoutes.create, work.params, request)).status).toBe("made");
    const jobs = await asOwner(api, "select id from pgboss.job where data ->> 'sheetId' = $1", [request.id]);
    expect(jobs).toHaveLength(1);
    const other = await client.refused(sheetRoutes.create, work.params, { ...request, units: "inch" });
    expect(other.code).toBe("id_reused");
  });

  test("leaves no sheet behind when its job cannot be queued: they are written together", async () => {
    const work = await revised(plainStudy);
    const request = sheetRequest();
    await asOwner(
      api,
      "alter table pgboss.job add constraint full_up check (name <> 'make-sheet') not valid",
    );
    const reply = await shop.members.fabricator.client.send("POST", pathTo(sheetRoutes.create, work.params), {
      body: request,
    });
    await asOwner(api, "alter table pgboss.job drop constraint full_up");
    expect(problemOf(reply).code).toBe("internal");
    const rows = await inWorkshop(api.connection.db, shop.id, ({ tx }) =>
      tx.select({ id: sheets.id }).from(sheets).where(eq(sheets.id, request.id)),
    );
    expect(rows).toEqual([]);
  });
});

describe("when the object store is away", () => {
  test("the worker tries again, and nothing half-made is shown in between", async () => {
    const work = await revised(plainStudy);
    let faults = 0;
    putFault = async () => {
      faults += 1;
      if (faults === 1) throw new Error("the store is away");
    };
    const sheet = await makeSheet(work);
    putFault = null;
    expect(faults).toBe(2);
    expect(sheet.status).toBe("made");
  });

  test("a sheet that fails every time says so, and what to do", async () => {
    const work = await revised(plainStudy);
    const request = sheetRequest();
    putFault = () => Promise.reject(new Error("the store is away"));
    await asOwner(api, "update pgboss.queue set retry_limit = 0 where name = 'make-sheet'");
    await shop.members.fabricator.client.call(sheetRoutes.create, work.params, request);
    const sheet = await finished(request.id);
    await asOwner(api, "update pgboss.queue set retry_limit = 4 where name = 'make-sheet'");
    putFault = null;
    expect(sheet).toMatchObject({ status: "failed", fileName: null });
    expect(sheet.failure).toContain("Ask for it again");
    const problem = problemOf(await download(sheet.id));
    expect(problem).toMatchObject({ code: "sheet_not_ready", detail: sheet.failure });
  });

  test("a download is refused for the moment, and says so", async () => {
    const sheet = await makeSheet(await revised(plainStudy));
    const away = await startApi({
      storage: { ...store.storage, open: () => store.storage.open("not/there") },
    });
    const elsewhere = await buildShop(away);
    const work = await buildStudy(elsewhere);
    await saveRevision(elsewhere, work);
    const { client } = elsewhere.members.owner;
    await client.call(sheetRoutes.create, work.params, { ...sheetRequest(), id: sheet.id });
    await inWorkshop(away.connection.db, elsewhere.id, ({ tx }) =>
      tx
        .update(sheets)
        .set({ status: "made", storageKey: "gone", fileName: "x.csv", byteSize: 1, finishedAt: new Date(0) }),
    );
    const path = pathTo(sheetRoutes.download, { workshopId: elsewhere.id, sheetId: sheet.id });
    const reply = await client.send("GET", path);
    await away.stop();
    expect(problemOf(reply).code).toBe("unavailable");
    expect(reply.headers.get("content-disposition")).toBeNull();
  });
});
