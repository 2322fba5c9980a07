import { type LengthUnit, type RevisionSummary, shortHash } from "@linkwright/contract";
import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { useRequestSheet } from "@/api/sheets.ts";
import { usePreferences } from "@/features/session/index.ts";
import { useStudy } from "@/features/study/index.ts";
import { formatDateTime } from "@/lib/format.ts";
import { makeId } from "@/lib/ids.ts";
import { Button } from "@/ui/Button.tsx";
import { Choice } from "@/ui/Choice.tsx";
import { ErrorState } from "@/ui/ErrorState.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Panel } from "@/ui/Panel.tsx";
import { Select } from "@/ui/Select.tsx";
import { Figure, Text } from "@/ui/Text.tsx";

const UNITS = [
  { value: "mm", label: "Millimetres" },
  { value: "inch", label: "Inches" },
] as const;

/** Asks for the hardpoint table of a revision as a CSV file. */
export function SheetForm({ revisions }: { revisions: readonly RevisionSummary[] }) {
  const { workshopId, studyId, study } = useStudy();
  const preferences = usePreferences();
  const [chosen, setChosen] = useState<number | null>(null);
  const [units, setUnits] = useState<LengthUnit>(preferences.units);
  const request = useRequestSheet(workshopId, studyId);
  const revision = revisions.find(({ number }) => number === chosen) ?? revisions[0];
  if (!revision) return null;
  const make = () =>
    request
      .mutateAsync({ id: makeId(), revision: revision.number, kind: "hardpointTable", units })
      .catch(() => undefined);
  return (
    <Panel title="Hardpoint table, CSV">
      <Select
        label="Revision"
        value={String(revision.number)}
        options={revisions.map(({ number, note }) => ({
          value: String(number),
          label: note ? `${number}: ${firstLine(note)}` : String(number),
        }))}
        onChange={(value) => setChosen(Number(value))}
      />
      <View style={styles.facts}>
        <Text variant="small" tone="inkSoft">
          {`${formatDateTime(revision.createdAt, { locale: preferences.locale })} by ${revision.createdBy.name}, code `}
          <Figure variant="figureSmall" tone="inkSoft">
            {shortHash(revision.hash)}
          </Figure>
        </Text>
        <Text variant="small" tone="inkSoft">
          {study.datum
            ? `Coordinates in the jig's datum of that revision.`
            : "Coordinates in the car's own axes: the study has no datum of a jig."}
        </Text>
      </View>
      <Choice label="Lengths" value={units} options={UNITS} onChange={setUnits} />
      {revision.status === "released" ? null : (
        <Notice kind="amber" title="Not released">
          The sheet will say NOT RELEASED. Do not weld from it.
        </Notice>
      )}
      {request.error ? <ErrorState title="The sheet was not asked for" error={request.error} /> : null}
      <Button kind="primary" label="Make the table" busyLabel="Asking for it…" onPress={make} />
    </Panel>
  );
}

function firstLine(note: string): string {
  const line = note.split("\n", 1)[0] ?? "";
  return line.length > 48 ? `${line.slice(0, 47)}…` : line;
}

const styles = StyleSheet.create({ facts: { gap: 2 } });
