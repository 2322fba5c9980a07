import { BuildsScreen } from "@/features/builds/index.ts";

export default function BuildsRoute() {
  return <BuildsScreen />;
}
