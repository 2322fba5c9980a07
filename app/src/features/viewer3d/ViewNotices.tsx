import { StyleSheet, View } from "react-native";
import { DomButton } from "../../ui/dom.tsx";
import { Text } from "../../ui/Text.tsx";
import { corner, dyedSteel, space, touch } from "../../ui/theme/tokens.ts";
import type { SceneStatus } from "./useSceneStage.ts";

interface ViewNoticesProps {
  readonly status: SceneStatus;
  readonly onRetry: () => void;
  readonly fault: string | null;
  readonly missing: string | null;
}

const TROUBLE: Readonly<Partial<Record<SceneStatus, string>>> = {
  unavailable: "This browser gives no 3-D graphics, so the picture is drawn flat. Views and arrow keys work.",
  lost: "The graphics processor stopped drawing; the picture is flat until it is drawn again.",
  failed: "The 3-D view could not be loaded; the picture is drawn flat.",
};

export function ViewNotices({ status, onRetry, fault, missing }: ViewNoticesProps) {
  const trouble = TROUBLE[status];
  return (
    <View style={styles.stack}>
      {fault ? <Line words={fault} tone="fault" /> : null}
      <View aria-live="polite" style={styles.stack}>
        {missing ? <Line words={missing} tone="amber" /> : null}
        {trouble ? <Line words={trouble} tone="ink" /> : null}
      </View>
      {status === "lost" || status === "failed" ? (
        <DomButton onClick={onRetry} style={styles.button}>
          <Text variant="label" style={styles.word}>
            Draw it again
          </Text>
        </DomButton>
      ) : null}
    </View>
  );
}

function Line({ words, tone }: { readonly words: string; readonly tone: "fault" | "amber" | "ink" }) {
  return (
    <View style={[styles.line, { borderLeftColor: dyedSteel[tone] }]}>
      <Text variant="small" style={{ color: dyedSteel[tone] }}>
        {words}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  stack: { gap: space.xs, alignItems: "flex-start" },
  line: {
    backgroundColor: dyedSteel.panel,
    borderLeftWidth: 3,
    paddingHorizontal: space.s,
    paddingVertical: space.xs,
    maxWidth: 420,
  },
  button: {
    minHeight: touch,
    paddingHorizontal: space.l,
    borderWidth: 1,
    borderStyle: "solid",
    borderColor: dyedSteel.ink,
    borderRadius: corner,
    backgroundColor: dyedSteel.ground,
    cursor: "pointer",
    pointerEvents: "auto",
  },
  word: { color: dyedSteel.ink },
});
