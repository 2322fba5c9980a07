import type { LengthUnit } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { Sign, type SignKind } from "@/ui/Sign.tsx";
import { Text } from "@/ui/Text.tsx";
import { type ColorName, space } from "@/ui/theme/tokens.ts";
import type { Judgement, Verdict } from "../targets/judge.ts";
import { verdictInWords } from "../targets/targetWords.ts";

const SIGN: Readonly<Record<Verdict, SignKind>> = {
  inside: "ok",
  below: "fault",
  above: "fault",
  unknown: "amber",
};
const TONE: Readonly<Record<Verdict, ColorName>> = {
  inside: "chromate",
  below: "fault",
  above: "fault",
  unknown: "amber",
};

/** In or out of target, by sign, word and colour. */
export function VerdictText({ judgement, units }: { judgement: Judgement; units: LengthUnit }) {
  const { verdict } = judgement;
  return (
    <View style={styles.row}>
      <Sign kind={SIGN[verdict]} size={16} />
      <Text variant="small" tone={TONE[verdict]} style={styles.words}>
        {verdictInWords(judgement, units)}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: "row", alignItems: "flex-start", gap: space.xs + 2 },
  words: { fontWeight: "600", flexShrink: 1 },
});
