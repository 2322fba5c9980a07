import { StyleSheet, View } from "react-native";
import { Button } from "@/ui/Button.tsx";
import { HiddenText } from "@/ui/HiddenText.tsx";
import { Sign } from "@/ui/Sign.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import type { FaultPlace, FaultReport } from "./reports.ts";

interface FaultListProps {
  readonly reports: readonly FaultReport[];
  readonly onShow: ((place: FaultPlace) => void) | undefined;
}

/** Each fault with where it lies, what it means and what to do. */
export function FaultList({ reports, onShow }: FaultListProps) {
  return (
    <View role="list" style={styles.list}>
      {reports.map((report) => (
        <FaultItem key={report.key} report={report} onShow={onShow} />
      ))}
    </View>
  );
}

function FaultItem({ report, onShow }: { report: FaultReport; onShow: FaultListProps["onShow"] }) {
  const { severity, title, where, meaning, advice, place } = report;
  const isRed = severity === "red";
  return (
    <View role="listitem" style={styles.item}>
      <Sign kind={isRed ? "fault" : "amber"} />
      <View style={styles.words}>
        <HiddenText>{isRed ? "Fault: " : "Caution: "}</HiddenText>
        <Text variant="strong" tone={isRed ? "fault" : "amber"}>
          {title}
        </Text>
        {where ? <Text variant="figureSmall">{where}</Text> : null}
        <Text variant="small">{meaning}</Text>
        <Text variant="small">
          <Text variant="small" style={styles.lead}>
            {"What to do: "}
          </Text>
          {advice}
        </Text>
        {place && onShow ? (
          <Button
            label="Show it there"
            accessibleLabel={`Show it there: ${title}`}
            onPress={() => onShow(place)}
            style={styles.show}
          />
        ) : null}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  list: {
    backgroundColor: color.panel,
    borderBottomWidth: 1,
    borderBottomColor: color.rule,
    maxHeight: "60dvh" as never,
    overflowY: "auto",
  } as object,
  item: {
    flexDirection: "row",
    gap: space.m,
    paddingHorizontal: space.l,
    paddingVertical: space.m,
    borderTopWidth: 1,
    borderTopColor: color.rule,
  },
  words: { flex: 1, minWidth: 0, gap: space.xs, maxWidth: 760 },
  lead: { fontWeight: "600" },
  show: { alignSelf: "flex-start", marginTop: space.xs },
});
