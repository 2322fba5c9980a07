import { useCallback, useMemo, useRef } from "react";
import { usePose } from "@/features/curves/index.ts";
import { type EditValue, useStudy } from "@/features/study/index.ts";
import { useEntry } from "./entry/EntryProvider.tsx";
import {
  type AxisIndex,
  editPathOf,
  fieldOf,
  listedPoint,
  type PointRow,
  pointGroups,
  withCoordinate,
} from "./entry/rows.ts";

/** The hardpoints of the side that is listed, and the ways to change them. */
export function usePointRows(selected: string | null) {
  const { study } = useStudy();
  const { kept, enter, putBack } = useEntry();
  const side = usePose((pose) => pose.side);
  const groups = useMemo(() => pointGroups(study.axle, side, kept), [study.axle, side, kept]);
  const rows = useMemo(() => groups.flatMap((group) => group.rows), [groups]);
  const listed = selected && listedPoint(study.axle, selected);
  const chosen: PointRow | null = rows.find(({ path }) => path === listed) ?? null;

  // Read when a coordinate is entered, so that rows which did not change need not render anew.
  const latest = useRef(rows);
  latest.current = rows;
  const onEnter = useCallback(
    (hardpoint: string, axis: AxisIndex, mm: number) => {
      const row = latest.current.find(({ path }) => path === hardpoint);
      if (row === undefined) return;
      const point: EditValue = [...withCoordinate(row.shown, axis, mm)];
      enter(row.editPath, point, fieldOf(hardpoint, axis));
    },
    [enter],
  );
  const onPutBack = useCallback((hardpoint: string) => putBack(editPathOf(hardpoint)), [putBack]);
  return { groups, rows, chosen, onEnter, onPutBack };
}
