import { memo } from "react";
import { StyleSheet, View } from "react-native";
import { useStudy } from "@/features/study/index.ts";
import { Button } from "@/ui/Button.tsx";
import { space } from "@/ui/theme/tokens.ts";

interface SearchPanelProps {
  readonly isBusy: boolean;
  readonly isMoved: boolean;
  /** Whether the axle can be built with the moves made. */
  readonly isSound: boolean;
  readonly onFind: () => void;
  readonly onCancel: () => void;
  readonly onPutBack: () => void;
  readonly onApply: () => void;
}

/** What is done with the moves: find the flattest, put back, apply. */
export const SearchPanel = memo(function SearchPanel(props: SearchPanelProps) {
  const { isBusy, isMoved, isSound, onFind, onCancel, onPutBack, onApply } = props;
  const { mayEdit } = useStudy();
  return (
    <View style={styles.buttons}>
      <View style={styles.row}>
        {isBusy ? <Button label="Cancel" onPress={onCancel} /> : null}
        <Button
          kind={isMoved ? "secondary" : "primary"}
          label="Find the flattest"
          busyLabel="Searching…"
          busy={isBusy}
          grow
          onPress={onFind}
        />
      </View>
      {isMoved ? (
        <View style={styles.row}>
          <Button label="Put back" grow onPress={onPutBack} />
          {mayEdit ? (
            <Button kind="primary" label="Apply" grow disabled={!isSound || isBusy} onPress={onApply} />
          ) : null}
        </View>
      ) : null}
    </View>
  );
});

const styles = StyleSheet.create({
  buttons: { gap: space.s },
  row: { flexDirection: "row", gap: space.s },
});
