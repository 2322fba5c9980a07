import { CurvesScreen } from "@/features/curves/index.ts";

export default function CurvesRoute() {
  return <CurvesScreen />;
}
