import { useDeferredValue, useMemo } from "react";
import {
  type Bench,
  chooseHeight,
  FiguresOfHeight,
  heightFigures,
  type Reading,
  usePose,
} from "@/features/curves/index.ts";

/** What the point being moved does to bump steer, where there is no room for the curve. */
export function BumpSteerLine({ bench, reading }: { bench: Bench; reading: Reading }) {
  const name = usePose((pose) => pose.height);
  const { axle, heights, targets } = useDeferredValue(bench);
  const height = chooseHeight(heights, name);
  const figures = useMemo(() => heightFigures(axle, height, targets), [axle, height, targets]);
  return <FiguresOfHeight figures={figures} reading={reading} />;
}
