import type { RevisionSummary, Sheet } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { sheetFileUrl } from "@/api/sheets.ts";
import { usePreferences } from "@/features/session/index.ts";
import { useStudy } from "@/features/study/index.ts";
import { formatBytes, formatDateTime } from "@/lib/format.ts";
import { EmptyState } from "@/ui/EmptyState.tsx";
import { FileLink } from "@/ui/FileLink.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Panel } from "@/ui/Panel.tsx";
import { Tag } from "@/ui/Tag.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";

interface SheetListProps {
  readonly sheets: readonly Sheet[];
  readonly revisions: readonly RevisionSummary[];
  readonly mayMake: boolean;
}

export function SheetList({ sheets, revisions, mayMake }: SheetListProps) {
  if (sheets.length === 0) {
    return (
      <EmptyState title="No sheet yet">
        {mayMake
          ? "Choose a revision and make the table; it will be listed here to download."
          : "Sheets that the engineer or the fabricator makes will be listed here to download."}
      </EmptyState>
    );
  }
  const isReleased = (number: number) =>
    revisions.find((revision) => revision.number === number)?.status === "released";
  return (
    <Panel title="Sheets" flush>
      <View role="list" aria-live="polite" style={styles.list}>
        {sheets.map((sheet) => (
          <SheetRow key={sheet.id} sheet={sheet} isReleased={isReleased(sheet.revision)} />
        ))}
      </View>
    </Panel>
  );
}

function SheetRow({ sheet, isReleased }: { sheet: Sheet; isReleased: boolean }) {
  const { locale } = usePreferences();
  return (
    <View role="listitem" style={styles.row}>
      <View style={styles.words}>
        <Text variant="strong">{`Hardpoint table, revision ${sheet.revision}, ${sheet.units === "inch" ? "inches" : "millimetres"}`}</Text>
        <Text
          variant="small"
          tone="inkSoft"
        >{`${formatDateTime(sheet.createdAt, { locale })} by ${sheet.createdBy.name}`}</Text>
        {sheet.status === "failed" ? (
          <Notice kind="fault" title="It could not be made">
            {sheet.failure ?? "The cause is not known. Make it again."}
          </Notice>
        ) : null}
      </View>
      <View style={styles.state}>
        <Tag label={isReleased ? "Released" : "Not released"} tone={isReleased ? "chromate" : "amber"} />
        <SheetFile sheet={sheet} />
      </View>
    </View>
  );
}

function SheetFile({ sheet }: { sheet: Sheet }) {
  const { workshopId } = useStudy();
  if (sheet.status === "queued") return <Text tone="inkSoft">Being made…</Text>;
  if (sheet.status === "failed") return null;
  const size = sheet.byteSize === null ? "" : ` (${formatBytes(sheet.byteSize)})`;
  return (
    <FileLink
      url={sheetFileUrl(workshopId, sheet.id)}
      fileName={sheet.fileName ?? undefined}
      label={`Download${size}`}
      accessibleLabel={`Download ${sheet.fileName ?? "the sheet"}`}
    />
  );
}

const styles = StyleSheet.create({
  list: { margin: 0, padding: 0 },
  row: {
    flexDirection: "row",
    flexWrap: "wrap",
    alignItems: "center",
    gap: space.m,
    paddingHorizontal: space.l,
    paddingVertical: space.m,
    borderTopWidth: 1,
    borderTopColor: color.rule,
    marginTop: -1,
  },
  words: { flexGrow: 1, flexBasis: 260, gap: space.hair },
  state: {
    flexDirection: "row",
    alignItems: "center",
    alignContent: "center",
    flexWrap: "wrap",
    gap: space.m,
  },
});
