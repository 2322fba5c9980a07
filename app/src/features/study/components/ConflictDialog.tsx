import type { EditConflict } from "@linkwright/contract";
import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { formatDateTime } from "@/lib/format.ts";
import { Button } from "@/ui/Button.tsx";
import { Choice } from "@/ui/Choice.tsx";
import { Dialog } from "@/ui/Dialog.tsx";
import { Heading } from "@/ui/Heading.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Figure, Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { pathInWords } from "../pathInWords.ts";
import { useSaving, useStudy } from "../StudyContext.tsx";
import type { ConflictChoice } from "../state.ts";
import { valueInWords } from "../valueInWords.ts";

const KEEP_OPTIONS = [
  { value: "theirs", label: "Theirs" },
  { value: "mine", label: "Mine" },
] as const;

/** Two people changed the same place: both values are shown, and the person chooses. */
export function ConflictDialog() {
  const { state } = useSaving();
  const [isLater, setIsLater] = useState(false);
  if (state.trouble?.status !== "conflict") return null;
  if (isLater) {
    return (
      <View style={styles.later}>
        <Notice
          kind="amber"
          title="A choice is waiting"
          actions={<Button label="Choose now" onPress={() => setIsLater(false)} />}
        >
          Someone changed the same point as you. Nothing is saved until you choose.
        </Notice>
      </View>
    );
  }
  return <ConflictForm conflicts={state.trouble.edits} onLater={() => setIsLater(true)} />;
}

function ConflictForm({ conflicts, onLater }: { conflicts: readonly EditConflict[]; onLater: () => void }) {
  const { dispatch } = useSaving();
  const [kept, setKept] = useState<Readonly<Record<string, ConflictChoice["keep"]>>>({});
  const keepOf = (conflict: EditConflict) => kept[conflict.path.join(".")] ?? "mine";
  const settle = () =>
    dispatch({
      type: "conflictSettled",
      choices: conflicts.map((conflict) => ({ path: conflict.path, keep: keepOf(conflict) })),
    });
  return (
    <Dialog
      title="Changed by two people"
      onClose={onLater}
      actions={
        <>
          <Button label="Later" onPress={onLater} />
          <Button kind="primary" label="Take what I chose" onPress={settle} />
        </>
      }
    >
      <Text>
        Someone changed the same place while you did. Choose which value stands; everything else has been
        joined.
      </Text>
      {conflicts.map((conflict) => (
        <ConflictRow
          key={conflict.path.join(".")}
          conflict={conflict}
          keep={keepOf(conflict)}
          onKeep={(keep) => setKept({ ...kept, [conflict.path.join(".")]: keep })}
        />
      ))}
    </Dialog>
  );
}

interface ConflictRowProps {
  readonly conflict: EditConflict;
  readonly keep: ConflictChoice["keep"];
  readonly onKeep: (keep: ConflictChoice["keep"]) => void;
}

function ConflictRow({ conflict, keep, onKeep }: ConflictRowProps) {
  const { study } = useStudy();
  const { words, units, locale } = usePreferences();
  const name = pathInWords(study.axle, conflict.path, words);
  const who = conflict.changedBy?.name ?? "someone else";
  const when = conflict.changedAt ? `, ${formatDateTime(conflict.changedAt, { locale })}` : "";
  return (
    <View style={styles.row}>
      <Heading level={3}>{name}</Heading>
      <Value label={`Theirs (${who}${when})`} text={valueInWords(conflict.theirs, units)} />
      <Value label="Mine" text={valueInWords(conflict.yours, units)} />
      <Value label="Before" text={valueInWords(conflict.base, units)} />
      <Choice label={`${name}: keep`} hideLabel value={keep} options={KEEP_OPTIONS} onChange={onKeep} />
    </View>
  );
}

function Value({ label, text }: { label: string; text: string }) {
  return (
    <View>
      <Text variant="small" tone="inkSoft">
        {label}
      </Text>
      <Figure>{text}</Figure>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { gap: space.s, paddingTop: space.m, borderTopWidth: 1, borderTopColor: color.rule },
  later: { position: "fixed", right: space.l, bottom: 96, zIndex: 22, maxWidth: 420 } as object,
});
