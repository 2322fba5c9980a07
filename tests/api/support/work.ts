// Builds, studies and revisions for a test to work on, made through the API as a person would make them.

import { randomUUID } from "node:crypto";
import { buildRoutes, revisionRoutes, type Study, studyRoutes } from "@linkwright/contract";
import { workedAxle } from "../../helpers/workedAxle.ts";
import type { Shop } from "./shop.ts";

/** The worked axle with two ride heights and a target. */
export const plainStudy: Study = {
  format: "linkwright.study/1",
  axle: workedAxle,
  rideHeights: [
    { name: "Road", wheelUp: 0, rakeDeg: 0, band: [-40, 40] },
    { name: "Track", wheelUp: 20, rakeDeg: 0, band: [-30, 30] },
  ],
  targets: [{ quantity: "bumpSteerDeg", min: -0.15, max: 0.15 }],
  datum: null,
  tolerances: [],
  pointNotes: [],
  locks: [],
  parts: [],
  shims: [],
};

export interface BuildAndStudy {
  readonly buildId: string;
  readonly studyId: string;
  /** What the study's own routes take. */
  readonly params: { readonly workshopId: string; readonly studyId: string };
}

export async function buildStudy(shop: Shop, study: Study = plainStudy): Promise<BuildAndStudy> {
  const { client } = shop.members.engineer;
  const [buildId, studyId] = [randomUUID(), randomUUID()];
  await client.call(buildRoutes.create, { workshopId: shop.id }, { id: buildId, name: "Kit one" });
  await client.call(
    studyRoutes.create,
    { workshopId: shop.id, buildId },
    { id: studyId, name: "Front axle", source: { type: "document", study } },
  );
  return { buildId, studyId, params: { workshopId: shop.id, studyId } };
}

export async function saveRevision(shop: Shop, { params }: BuildAndStudy, note = ""): Promise<number> {
  const { client } = shop.members.engineer;
  const { version } = await client.call(studyRoutes.get, params);
  const revision = await client.call(revisionRoutes.save, params, { id: randomUUID(), version, note });
  return revision.number;
}
