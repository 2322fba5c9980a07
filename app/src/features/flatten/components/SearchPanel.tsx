import { StyleSheet, View } from "react-native";
import { useStudy } from "@/features/study/index.ts";
import { Button } from "@/ui/Button.tsx";
import { space } from "@/ui/theme/tokens.ts";
import type { FlattenBench } from "../useFlatten.ts";

/** What is done with the moves: find the flattest, put back, apply. */
export function SearchPanel({ bench }: { bench: FlattenBench }) {
  const { mayEdit } = useStudy();
  const { search, isMoved, isSound, putBack, apply } = bench;
  const isBusy = search.state.status === "busy";
  return (
    <View style={styles.buttons}>
      <View style={styles.row}>
        {isBusy ? <Button label="Cancel" onPress={search.cancel} /> : null}
        <Button
          kind={isMoved ? "secondary" : "primary"}
          label="Find the flattest"
          busyLabel="Searching…"
          busy={isBusy}
          grow
          onPress={() => void search.find()}
        />
      </View>
      {isMoved ? (
        <View style={styles.row}>
          <Button label="Put back" grow onPress={putBack} />
          {mayEdit ? (
            <Button kind="primary" label="Apply" grow disabled={!isSound || isBusy} onPress={apply} />
          ) : null}
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  buttons: { gap: space.s },
  row: { flexDirection: "row", gap: space.s },
});
