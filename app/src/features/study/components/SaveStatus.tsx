import type { StudyAnswer } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { formatTimeOfDay } from "@/lib/format.ts";
import { Sign } from "@/ui/Sign.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { useSaving } from "../StudyContext.tsx";
import { hasUnsaved, type OpenStudy } from "../state.ts";

type Phase = "saved" | "saving" | "unsaved" | "troubled";

function phaseOf(state: OpenStudy, isSound: boolean): Phase {
  if (state.trouble && state.trouble.status !== "impossible") return "troubled";
  if (!hasUnsaved(state)) return "saved";
  if (!isSound) return "troubled";
  return state.inFlight ? "saving" : "unsaved";
}

/** Which draft this is, and whether the server has it. */
export function SaveStatus({ study }: { study: StudyAnswer }) {
  const { state, issues } = useSaving();
  const { locale } = usePreferences();
  const phase = phaseOf(state, issues.length === 0);
  const draft = study.latestRevision === null ? "Draft" : `Draft after rev ${study.latestRevision}`;
  const words: Record<Phase, string> = {
    saved: `saved ${formatTimeOfDay(study.updatedAt, { locale })}`,
    saving: "saving…",
    unsaved: "saving soon…",
    troubled: "not saved yet",
  };
  return (
    <View role="status" style={styles.row}>
      {phase === "troubled" ? <Sign kind="amber" size={16} /> : null}
      <Text variant="label" tone={phase === "troubled" ? "amber" : "inkSoft"} numberOfLines={1}>
        {`${draft} · ${words[phase]}`}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: "row", alignItems: "center", gap: space.xs, flexShrink: 1, minWidth: 0 },
});
