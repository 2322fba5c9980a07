import { View } from "react-native";
import type { Reading } from "@/features/curves/index.ts";
import { Button } from "@/ui/Button.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import { heldInWords, stoppedInWords } from "../flattenWords.ts";
import { OFFERED_MOVES } from "../moves.ts";
import type { FlattenBench } from "../useFlatten.ts";

/** What the last search says for itself, as long as its answer is what is shown. */
export function SearchNotes({ bench, reading }: { bench: FlattenBench; reading: Reading }) {
  const { axle, settings, search } = bench;
  const { state } = search;
  if (state.status === "failed") {
    return (
      <Notice
        kind="fault"
        live
        title="The search could not run"
        actions={<Button label="Try again" onPress={search.find} />}
      >
        <Text variant="small">
          {state.error instanceof Error ? state.error.message : "This browser gave it no worker."}
        </Text>
      </Notice>
    );
  }
  if (state.status !== "answered" || state.search.drawn !== axle) return null;
  const { outcome } = state;
  if (outcome.status === "refused") {
    return (
      <Notice kind="amber" live title="No search made">
        {outcome.because}
      </Notice>
    );
  }
  const isShown = OFFERED_MOVES.every((move) => {
    const found = outcome.moves.find((each) => each.move === move);
    return found === undefined || found.mm === settings[move].mm;
  });
  if (!isShown) return null;
  const held = heldInWords(outcome, settings, axle.steering, reading.units);
  return (
    <Notice kind={held.length > 0 ? "amber" : "info"} live title="The flattest within these bounds">
      <View>
        <Text variant="small">{stoppedInWords(outcome)}</Text>
        {held.map((text) => (
          <Text key={text} variant="small">
            {text}
          </Text>
        ))}
      </View>
    </Notice>
  );
}
