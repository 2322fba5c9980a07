export { CurvesScreen } from "./CurvesScreen.tsx";
export { CurveBoard } from "./components/CurveBoard.tsx";
export { HeightChoice } from "./components/HeightChoice.tsx";
export { HeightsFigures } from "./components/HeightsFigures.tsx";
export { LinkagePane } from "./components/LinkagePane.tsx";
export { StartingTargets } from "./components/StartingTargets.tsx";
export { StudySafety } from "./components/StudySafety.tsx";
export { TargetStrip } from "./components/TargetStrip.tsx";
export { VerdictText } from "./components/VerdictText.tsx";
export { PoseProvider, usePose, usePoseStore } from "./pose/PoseProvider.tsx";
export { type HeightFigures, heightFigures } from "./series/figures.ts";
export { chooseHeight } from "./series/heights.ts";
export type { Reading } from "./series/panels.ts";
export type { Quantity } from "./series/sweepHeight.ts";
export { formatToeAngle } from "./series/toeDisplay.ts";
export { useReading } from "./series/useReading.ts";
export {
  boundsInWords,
  QUANTITY_KIND,
  quantityName,
} from "./targets/targetWords.ts";
export { useAtRest } from "./useAtRest.ts";
export { type Bench, useBench } from "./useBench.ts";
export { type Earlier, useLastRevision } from "./useLastRevision.ts";
