import { useLocalSearchParams } from "expo-router";
import { BuildScreen } from "@/features/builds/index.ts";

export default function BuildRoute() {
  const { buildId } = useLocalSearchParams<{ buildId: string }>();
  return <BuildScreen key={buildId} buildId={buildId} />;
}
