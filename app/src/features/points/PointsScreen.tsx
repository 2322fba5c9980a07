import { useBench, useReading } from "@/features/curves/index.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { PhonePoints } from "./components/PhonePoints.tsx";
import { WidePoints } from "./components/WidePoints.tsx";
import { useFieldUndo } from "./entry/useFieldUndo.ts";

/** The drawing itself: hardpoints, and what else makes the axle. */
export function PointsScreen() {
  const bench = useBench();
  const isWide = useIsWide();
  const { reading } = useReading();
  useFieldUndo();
  return isWide ? (
    <WidePoints bench={bench} reading={reading} />
  ) : (
    <PhonePoints bench={bench} reading={reading} />
  );
}
