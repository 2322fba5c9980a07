import type { Axle, RideHeight } from "@linkwright/kinematics";
import { useQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { revisionQuery } from "@/api/revisions.ts";
import { studyQuery } from "@/api/studies.ts";
import { useStudy } from "@/features/study/index.ts";
import { heightsOf } from "./series/heights.ts";

/** Something to compare the present curves with. */
export interface Earlier {
  readonly label: string;
  readonly axle: Axle;
  readonly heights: readonly RideHeight[];
}

const NONE: readonly Earlier[] = [];

/** The study's last revision, once it is loaded; nothing before the first. A revision never changes. */
export function useLastRevision(): readonly Earlier[] {
  const { workshopId, studyId } = useStudy();
  const { data: study } = useQuery(studyQuery(workshopId, studyId));
  const number = study?.latestRevision ?? null;
  const { data: revision } = useQuery({
    ...revisionQuery(workshopId, studyId, number ?? 0),
    enabled: number !== null,
  });
  return useMemo(
    () =>
      revision
        ? [
            {
              label: `rev ${revision.number}`,
              axle: revision.study.axle,
              heights: heightsOf(revision.study),
            },
          ]
        : NONE,
    [revision],
  );
}
