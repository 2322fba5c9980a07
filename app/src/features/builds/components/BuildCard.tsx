import type { Build } from "@linkwright/contract";
import { usePreferences } from "@/features/session/index.ts";
import { formatCount, formatDate } from "@/lib/format.ts";
import { Text } from "@/ui/Text.tsx";
import { Card } from "./Card.tsx";

export function BuildCard({ build }: { build: Build }) {
  const { locale } = usePreferences();
  const studies = build.studyCount === 0 ? "No study yet" : formatCount(build.studyCount, "study", "studies");
  return (
    <Card
      href={{ pathname: "/builds/[buildId]", params: { buildId: build.id } }}
      title={build.name}
      foot={`${studies} · changed ${formatDate(build.updatedAt, { locale })}`}
    >
      <Text tone="inkSoft" numberOfLines={3}>
        {build.summary || "No description."}
      </Text>
    </Card>
  );
}
