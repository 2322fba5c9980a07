import type { Study } from "@linkwright/contract";

/** A study of an axle with what is asked of it; what the format keeps a place for is empty. */
export function studyOf(
  axle: Study["axle"],
  asked: Pick<Study, "rideHeights" | "targets"> & Partial<Pick<Study, "datum">>,
): Study {
  return {
    format: "linkwright.study/1",
    axle,
    rideHeights: asked.rideHeights,
    targets: asked.targets,
    datum: asked.datum ?? null,
    tolerances: [],
    pointNotes: [],
    locks: [],
    parts: [],
    shims: [],
  };
}
