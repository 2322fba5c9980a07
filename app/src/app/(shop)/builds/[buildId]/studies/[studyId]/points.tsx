import { PointsScreen } from "@/features/points/index.ts";

export default function PointsRoute() {
  return <PointsScreen />;
}
