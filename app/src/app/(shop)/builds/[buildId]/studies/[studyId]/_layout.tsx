import { Slot, useLocalSearchParams } from "expo-router";
import { StudyShell } from "@/features/study/index.ts";

export default function StudyLayout() {
  const { buildId, studyId } = useLocalSearchParams<{ buildId: string; studyId: string }>();
  return (
    <StudyShell key={studyId} buildId={buildId} studyId={studyId}>
      <Slot />
    </StudyShell>
  );
}
