import type { StudySummary } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { formatCount, formatDateTime } from "@/lib/format.ts";
import { Tag } from "@/ui/Tag.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { Card } from "./Card.tsx";

export function StudyCard({ study }: { study: StudySummary }) {
  const { locale } = usePreferences();
  const { id, buildId, name, position, latestRevision, openComments, updatedBy, updatedAt } = study;
  return (
    <Card
      href={{ pathname: "/builds/[buildId]/studies/[studyId]", params: { buildId, studyId: id } }}
      title={name}
      foot={`Changed ${formatDateTime(updatedAt, { locale })} by ${updatedBy.name}`}
    >
      <View style={styles.tags}>
        <Tag label={position === "front" ? "Front axle" : "Rear axle"} />
        <Tag
          label={latestRevision === null ? "Draft only" : `Revision ${latestRevision}`}
          tone={latestRevision === null ? "amber" : "dye"}
        />
      </View>
      <Text tone="inkSoft" variant="small">
        {openComments === 0 ? "No open comments" : formatCount(openComments, "open comment")}
      </Text>
    </Card>
  );
}

const styles = StyleSheet.create({ tags: { flexDirection: "row", flexWrap: "wrap", gap: space.s } });
