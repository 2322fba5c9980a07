import type { Issue } from "@linkwright/kinematics";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { Button } from "@/ui/Button.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { pathInWords } from "../pathInWords.ts";
import { useSaving, useStudy } from "../StudyContext.tsx";
import { valueInWords } from "../valueInWords.ts";

/** Whatever stands between what was typed and the server, above every screen of the study. */
export function TroubleBar() {
  const { state, issues, isKeptOnDevice } = useSaving();
  const { trouble } = state;
  const notices = [
    issues.length > 0 ? <UnsoundNotice key="unsound" issues={issues} /> : null,
    trouble && trouble.status !== "conflict" ? <TroubleNotice key="trouble" /> : null,
    isKeptOnDevice ? null : <NotKeptNotice key="notKept" />,
  ].filter(Boolean);
  return notices.length > 0 ? <View style={styles.bar}>{notices}</View> : null;
}

function UnsoundNotice({ issues }: { issues: readonly Issue[] }) {
  const { study, undo, canUndo } = useStudy();
  const { words } = usePreferences();
  return (
    <Notice
      kind="fault"
      live
      title="This cannot be built as it stands, so it is not saved"
      actions={canUndo ? <Button label="Undo the last change" onPress={undo} /> : null}
    >
      {issues.map(({ path, problem, hint }) => (
        <Text
          key={`${path.join(".")} ${problem}`}
        >{`${pathInWords(study.axle, path, words)}: ${problem} ${hint}`}</Text>
      ))}
    </Notice>
  );
}

function TroubleNotice() {
  const { state, dispatch } = useSaving();
  const { study } = useStudy();
  const { words, units } = usePreferences();
  const { trouble } = state;
  switch (trouble?.status) {
    case "delayed":
      return (
        <Notice kind="amber" live title={`Not saved yet: ${trouble.problem.title.toLowerCase()}`}>
          Your changes are kept on this device and sent again by themselves.
        </Notice>
      );
    case "refused":
      return (
        <ErrorState
          title="The server does not take these changes"
          error={trouble.problem}
          actions={
            <Button
              label="Put back to the saved draft"
              onPress={() => dispatch({ type: "unsavedDiscarded" })}
            />
          }
        />
      );
    case "impossible":
      return (
        <Notice kind="fault" live title="That value is not possible here">
          {`${pathInWords(study.axle, trouble.path, words)}: ${valueInWords(trouble.value, units)} was not taken. The draft is as it was before.`}
        </Notice>
      );
    default:
      return null;
  }
}

function NotKeptNotice() {
  return (
    <Notice kind="amber" title="This browser keeps nothing on the device">
      Leave the page open until the changes are saved: what is not saved would go with it.
    </Notice>
  );
}

const styles = StyleSheet.create({ bar: { gap: space.s, padding: space.l } });
