import { type Axle, checkAxle, type Issue } from "@linkwright/kinematics";
import { type Dispatch, useCallback, useMemo, useRef } from "react";
import type { Bench } from "@/features/curves/index.ts";
import { useStudy } from "@/features/study/index.ts";
import { useMoves } from "./FlattenProvider.tsx";
import { isMoved, type MoveAction, type MoveSettings, movedAxle, searchFor } from "./moves.ts";
import { useSearch } from "./useSearch.ts";

export interface FlattenBench {
  /** As drawn. */
  readonly axle: Axle;
  /** With the moves made; the last that can be built, where these cannot. */
  readonly moved: Axle;
  readonly settings: MoveSettings;
  readonly dispatch: Dispatch<MoveAction>;
  readonly isMoved: boolean;
  readonly issues: readonly Issue[];
  readonly isSound: boolean;
  readonly search: ReturnType<typeof useSearch>;
  readonly putBack: () => void;
  /** Writes the moves into the drawing, as one step of undo. */
  readonly apply: () => void;
}

export function useFlatten({ axle, heights }: Bench): FlattenBench {
  const { changeValues } = useStudy();
  const { settings, dispatch } = useMoves();
  const wanted = useMemo(() => movedAxle(axle, settings), [axle, settings]);
  const issues = useMemo(() => (wanted === axle ? [] : checkAxle(wanted)), [wanted, axle]);
  const isSound = issues.length === 0;
  const lastSound = useRef(wanted);
  if (isSound) lastSound.current = wanted;
  const present = useMemo(() => searchFor(axle, settings, heights), [axle, settings, heights]);
  const search = useSearch(present, (outcome) => {
    if (outcome.status === "found") dispatch({ type: "answerTaken", moves: outcome.moves });
  });
  const putBack = useCallback(() => dispatch({ type: "putBack" }), [dispatch]);
  const latest = useRef(wanted);
  latest.current = wanted;
  const apply = useCallback(() => {
    changeValues(changesTo(latest.current));
    dispatch({ type: "putBack" });
  }, [changeValues, dispatch]);
  return {
    axle,
    moved: lastSound.current,
    settings,
    dispatch,
    isMoved: isMoved(axle, settings),
    issues,
    isSound,
    search,
    putBack,
    apply,
  };
}

/** The moves offered shift inner joints alone. */
function changesTo(axle: Axle) {
  const left = { path: ["axle", "left", "tieRod", "inner"], to: [...axle.left.tieRod.inner] };
  if (axle.right === "mirror") return [left];
  return [left, { path: ["axle", "right", "tieRod", "inner"], to: [...axle.right.tieRod.inner] }];
}
