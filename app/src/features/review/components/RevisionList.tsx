import { type RevisionStatus, type RevisionSummary, shortHash } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { formatDateTime } from "@/lib/format.ts";
import { EmptyState } from "@/ui/EmptyState.tsx";
import { Panel } from "@/ui/Panel.tsx";
import { Tag } from "@/ui/Tag.tsx";
import { Figure, Text } from "@/ui/Text.tsx";
import { type ColorName, color, space } from "@/ui/theme/tokens.ts";

const STATUS: Record<RevisionStatus, { readonly label: string; readonly tone: ColorName }> = {
  saved: { label: "Saved", tone: "inkSoft" },
  inReview: { label: "In review", tone: "dye" },
  changesAsked: { label: "Changes asked", tone: "amber" },
  approved: { label: "Approved", tone: "chromate" },
  released: { label: "Released", tone: "chromate" },
  superseded: { label: "Superseded", tone: "inkSoft" },
};

export function RevisionList({ revisions }: { revisions: readonly RevisionSummary[] }) {
  const { locale } = usePreferences();
  if (revisions.length === 0) {
    return (
      <EmptyState title="No revision yet">
        A revision is the study as it stood at one moment, numbered and never changed again.
      </EmptyState>
    );
  }
  return (
    <Panel title="Revisions" flush>
      <View role="list" style={styles.list}>
        {revisions.map(({ number, note, status, hash, createdBy, createdAt }) => (
          <View role="listitem" key={number} style={styles.item}>
            <View style={styles.head}>
              <Text variant="strong">{`Revision ${number}`}</Text>
              <Tag {...STATUS[status]} />
            </View>
            {note ? <Text>{note}</Text> : null}
            <Text variant="small" tone="inkSoft">
              {`${formatDateTime(createdAt, { locale })} by ${createdBy.name}, code `}
              <Figure variant="figureSmall" tone="inkSoft">
                {shortHash(hash)}
              </Figure>
            </Text>
          </View>
        ))}
      </View>
    </Panel>
  );
}

const styles = StyleSheet.create({
  list: { margin: 0, padding: 0 },
  item: { padding: space.l, gap: space.xs, borderTopWidth: 1, borderTopColor: color.rule, marginTop: -1 },
  head: { flexDirection: "row", alignItems: "center", justifyContent: "space-between", gap: space.m },
});
