import { StyleSheet, View } from "react-native";
import { DomButton } from "@/ui/dom.tsx";
import { color, corner, touch } from "@/ui/theme/tokens.ts";
import { useStudy } from "../StudyContext.tsx";

export function UndoButtons() {
  const { mayEdit, canUndo, canRedo, undo, redo } = useStudy();
  if (!mayEdit) return null;
  return (
    <View style={styles.pair}>
      <ArrowButton label="Undo" isDisabled={!canUndo} onPress={undo} />
      <ArrowButton label="Redo" isMirrored isDisabled={!canRedo} onPress={redo} />
    </View>
  );
}

interface ArrowButtonProps {
  readonly label: string;
  readonly isMirrored?: boolean;
  readonly isDisabled: boolean;
  readonly onPress: () => void;
}

function ArrowButton({ label, isMirrored, isDisabled, onPress }: ArrowButtonProps) {
  return (
    <DomButton
      className="button button-quiet"
      aria-label={label}
      title={label}
      disabled={isDisabled}
      onClick={onPress}
      style={styles.button}
    >
      <svg
        aria-hidden="true"
        width="20"
        height="20"
        viewBox="0 0 20 20"
        transform={isMirrored ? "scale(-1 1)" : undefined}
      >
        <path
          d="M7 3 3 7l4 4M3.5 7H12a4.5 4.5 0 0 1 0 9H7"
          fill="none"
          stroke={isDisabled ? color.edge : color.ink}
          strokeWidth="1.8"
          strokeLinecap="round"
          strokeLinejoin="round"
        />
      </svg>
    </DomButton>
  );
}

const styles = StyleSheet.create({
  pair: { flexDirection: "row" },
  button: {
    width: touch,
    height: touch,
    padding: 0,
    borderWidth: 0,
    backgroundColor: "transparent",
    borderRadius: corner,
    cursor: "pointer",
    display: "flex",
    alignItems: "center",
    justifyContent: "center",
  },
});
