import { type LengthUnit, StudySchema } from "@linkwright/contract";
import type { RideHeight } from "@linkwright/kinematics";
import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { type EditValue, useStudy } from "@/features/study/index.ts";
import { formatAngle, formatLength } from "@/lib/format.ts";
import { Button } from "@/ui/Button.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { issuesWith } from "../entry/attempt.ts";
import { unbroken } from "../form/fieldKinds.ts";
import type { FormField } from "../form/formSchema.ts";
import { PartDialog } from "../form/PartDialog.tsx";
import { EntryRow } from "./EntryRow.tsx";

const FIELDS: readonly FormField[] = [
  { name: "name", label: "Name", kind: "text" },
  {
    name: "wheelUp",
    label: "Wheel up",
    help: "From the drawn position; a lowered car is positive",
    kind: "length",
  },
  { name: "rakeDeg", label: "Rake", help: "Nose down is positive", kind: "angle" },
  { name: "droop", label: "Band, droop end", help: "About this ride height, 0 or less", kind: "length" },
  { name: "bump", label: "Band, bump end", help: "About this ride height, 0 or more", kind: "length" },
];
const HeightSchema = StudySchema.shape.rideHeights.element;

/** The heights at which toe is set again, each with the travel over which its targets count. */
export function HeightsSection({ units }: { units: LengthUnit }) {
  const { study, mayEdit, changeValue } = useStudy();
  /** An index of the list, or its length for one to come. */
  const [open, setOpen] = useState<number | null>(null);
  const { rideHeights } = study;
  const put = (next: readonly RideHeight[]) => {
    const to = next.map(({ band, ...rest }): EditValue => ({ ...rest, band: [...band] })) as EditValue;
    const path = ["rideHeights"];
    const issues = issuesWith(study, [{ path, to }]);
    if (issues.length === 0) changeValue(path, to);
    return issues;
  };
  const edited = open === null ? undefined : rideHeights[open];
  return (
    <View style={styles.section}>
      {rideHeights.length === 0 ? (
        <Text tone="inkSoft">None yet: curves stand at the design height.</Text>
      ) : null}
      <View role="list">
        {rideHeights.map((height, at) => (
          <EntryRow
            key={height.name}
            name={height.name}
            details={heightInWords(height, units)}
            onEdit={mayEdit ? () => setOpen(at) : undefined}
            onRemove={mayEdit ? () => put(rideHeights.filter((other) => other !== height)) : undefined}
          />
        ))}
      </View>
      {mayEdit ? (
        <Button label="Add a ride height" onPress={() => setOpen(rideHeights.length)} style={styles.start} />
      ) : null}
      {open === null ? null : (
        <PartDialog
          title={edited ? `Ride height ${edited.name}` : "Add a ride height"}
          fields={FIELDS}
          given={edited ? { ...edited, droop: edited.band[0], bump: edited.band[1] } : { rakeDeg: 0 }}
          units={units}
          shape={({ droop, bump, ...rest }) => ({ ...rest, band: [droop, bump] })}
          part={HeightSchema}
          onSave={(height) => put(withEntry(rideHeights, open, height))}
          onClose={() => setOpen(null)}
        />
      )}
    </View>
  );
}

/** The list with one entry put in place, or after its end. */
export function withEntry<Entry>(list: readonly Entry[], at: number, entry: Entry): Entry[] {
  return [...list.slice(0, at), entry, ...list.slice(at + 1)];
}

function heightInWords({ wheelUp, rakeDeg, band }: RideHeight, units: LengthUnit): string {
  const length = (mm: number) => unbroken(formatLength(mm, units, { sign: "always" }));
  const rake = rakeDeg === 0 ? "" : `, rake ${formatAngle(rakeDeg)}`;
  return `wheel up ${length(wheelUp)}${rake}, band ${length(band[0])} to ${length(band[1])}`;
}

const styles = StyleSheet.create({
  section: { gap: space.m },
  start: { alignSelf: "flex-start" },
});
