import { usePathname } from "expo-router";
import { View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { pathInWords, useStudy } from "@/features/study/index.ts";
import { LinkButton } from "@/ui/Link.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import { useEntry } from "../entry/EntryProvider.tsx";

/** On the study's other screens: what was typed under Points and is not in the drawing, so that nobody relies on it. */
export function KeptNotice() {
  const { buildId, studyId, study } = useStudy();
  const { words } = usePreferences();
  const { kept } = useEntry();
  const isAtPoints = usePathname().endsWith("/points");
  if (kept.length === 0 || isAtPoints) return null;
  const params = { buildId, studyId };
  return (
    <Notice
      kind="amber"
      title="Typed under Points, but not in the drawing"
      actions={
        <LinkButton
          href={{ pathname: "/builds/[buildId]/studies/[studyId]/points", params }}
          label="Go to Points"
        />
      }
    >
      <View role="list">
        {kept.map(({ change, issue }) => (
          <View role="listitem" key={change.path.join(".")}>
            <Text variant="small">{`${pathInWords(study.axle, change.path, words)}: ${issue.problem}`}</Text>
          </View>
        ))}
      </View>
    </Notice>
  );
}
