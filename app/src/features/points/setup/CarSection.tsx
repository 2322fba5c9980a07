import { AxleSchema, type LengthUnit } from "@linkwright/contract";
import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { type EditValue, useStudy } from "@/features/study/index.ts";
import { space } from "@/ui/theme/tokens.ts";
import { issuesWith } from "../entry/attempt.ts";
import { type FieldKind, labelledValue } from "../form/fieldKinds.ts";
import type { FormField } from "../form/formSchema.ts";
import { PartDialog } from "../form/PartDialog.tsx";
import { EntryRow } from "./EntryRow.tsx";
import { ValueField } from "./ValueField.tsx";

type BodyField = FormField & { readonly kind: FieldKind };

const BODY: readonly BodyField[] = [
  { name: "massKg", label: "Mass", help: "Of the whole car as it is driven", kind: "mass" },
  { name: "unsprungMassKg", label: "Unsprung mass", help: "Of this axle, both sides together", kind: "mass" },
  { name: "frontMassShare", label: "Mass on the front axle", kind: "share" },
  { name: "cgHeight", label: "Height of the centre of mass", help: "Above the ground", kind: "length" },
  { name: "frontBrakeShare", label: "Braking at the front", kind: "share" },
  { name: "driveShare", label: "Drive at this axle", kind: "share" },
];
const BodySchema = AxleSchema.shape.body.unwrap();
const PATH = ["axle", "body"];

/** What belongs to the car and not to the linkage; each figure is optional, and what needs it says so. */
export function CarSection({ units }: { units: LengthUnit }) {
  const { study, mayEdit, changeValue } = useStudy();
  const [isOpen, setIsOpen] = useState(false);
  const body: Readonly<Record<string, number | undefined>> = { ...study.axle.body };
  const save = (part: unknown) => {
    const isEmpty = Object.keys(part as object).length === 0;
    const to = (isEmpty ? undefined : part) as EditValue;
    const issues = issuesWith(study, [{ path: PATH, to }]);
    if (issues.length === 0) changeValue(PATH, to);
    return issues;
  };
  const given = BODY.filter(({ name }) => body[name] !== undefined);
  const details = given.map(({ name, label, kind }) => `${label} ${labelledValue(body[name], kind, units)}`);
  return (
    <View style={styles.section}>
      <ValueField path={["axle", "wheelbase"]} label="Wheelbase" kind="length" units={units} />
      <View role="list">
        <EntryRow
          name="Masses, brakes and drive"
          details={details.length > 0 ? details.join(" · ") : "not given"}
          onEdit={mayEdit ? () => setIsOpen(true) : undefined}
        />
      </View>
      {isOpen ? (
        <PartDialog
          title="Masses, brakes and drive"
          intro="Anti-dive and anti-lift need the height of the centre of mass and the braking at the front. Leave empty what is not known."
          fields={BODY}
          given={body}
          units={units}
          part={BodySchema}
          onSave={save}
          onClose={() => setIsOpen(false)}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({ section: { gap: space.m } });
