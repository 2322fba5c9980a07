import { Slot, useLocalSearchParams } from "expo-router";
import { PoseProvider, StudySafety } from "@/features/curves/index.ts";
import { FlattenProvider } from "@/features/flatten/index.ts";
import { EntryProvider, KeptNotice } from "@/features/points/index.ts";
import { StudyShell } from "@/features/study/index.ts";

export default function StudyLayout() {
  const { buildId, studyId } = useLocalSearchParams<{ buildId: string; studyId: string }>();
  return (
    <StudyShell key={studyId} buildId={buildId} studyId={studyId}>
      <PoseProvider>
        <EntryProvider>
          <FlattenProvider>
            <StudySafety>
              <KeptNotice />
              <Slot />
            </StudySafety>
          </FlattenProvider>
        </EntryProvider>
      </PoseProvider>
    </StudyShell>
  );
}
