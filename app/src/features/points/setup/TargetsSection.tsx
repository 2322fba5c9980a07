import { type LengthUnit, StudySchema } from "@linkwright/contract";
import { TARGET_QUANTITIES, type Target, type TargetQuantity } from "@linkwright/kinematics";
import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { boundsInWords, QUANTITY_KIND, quantityName, StartingTargets } from "@/features/curves/index.ts";
import { usePreferences } from "@/features/session/index.ts";
import { type EditValue, useStudy } from "@/features/study/index.ts";
import { Button } from "@/ui/Button.tsx";
import { Select } from "@/ui/Select.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { issuesWith } from "../entry/attempt.ts";
import type { FormField } from "../form/formSchema.ts";
import { PartDialog } from "../form/PartDialog.tsx";
import { EntryRow } from "./EntryRow.tsx";
import { withEntry } from "./HeightsSection.tsx";

const TargetSchema = StudySchema.shape.targets.element;

/** What every ride height is judged by. */
export function TargetsSection({ units }: { units: LengthUnit }) {
  const { study, mayEdit, changeValue } = useStudy();
  const { words } = usePreferences();
  const [open, setOpen] = useState<number | null>(null);
  const { targets } = study;
  const put = (next: readonly Target[]) => {
    const to = next.map((target): EditValue => ({ ...target })) as EditValue;
    const path = ["targets"];
    const issues = issuesWith(study, [{ path, to }]);
    if (issues.length === 0) changeValue(path, to);
    return issues;
  };
  const free = TARGET_QUANTITIES.filter(
    (quantity) => !targets.some((target) => target.quantity === quantity),
  );
  return (
    <View style={styles.section}>
      {targets.length === 0 ? <Text tone="inkSoft">None yet.</Text> : null}
      <View role="list">
        {targets.map((target, at) => (
          <EntryRow
            key={target.quantity}
            name={quantityName(target.quantity, words)}
            details={boundsInWords(target, units)}
            onEdit={mayEdit ? () => setOpen(at) : undefined}
            onRemove={mayEdit ? () => put(targets.filter((other) => other !== target)) : undefined}
          />
        ))}
      </View>
      <StartingTargets units={units} />
      {mayEdit && free.length > 0 ? (
        <Button label="Add a target" onPress={() => setOpen(targets.length)} style={styles.start} />
      ) : null}
      {open === null ? null : (
        <TargetDialog
          target={targets[open] ?? null}
          free={free}
          units={units}
          onSave={(target) => put(withEntry(targets, open, target))}
          onClose={() => setOpen(null)}
        />
      )}
    </View>
  );
}

interface TargetDialogProps {
  /** Null for one to come. */
  readonly target: Target | null;
  readonly free: readonly TargetQuantity[];
  readonly units: LengthUnit;
  readonly onSave: (target: Target) => ReturnType<typeof issuesWith>;
  readonly onClose: () => void;
}

function TargetDialog({ target, free, units, onSave, onClose }: TargetDialogProps) {
  const { words } = usePreferences();
  const [quantity, setQuantity] = useState(target?.quantity ?? free[0] ?? "bumpSteerDeg");
  const kind = QUANTITY_KIND[quantity];
  const fields: readonly FormField[] = [
    { name: "min", label: "At least", help: "May stay empty", kind },
    { name: "max", label: "At most", help: "May stay empty", kind },
  ];
  return (
    <PartDialog
      title={target ? `Target for ${quantityName(quantity, words)}` : "Add a target"}
      fields={fields}
      given={{ ...target }}
      units={units}
      empty={null}
      shape={(values) => ({ min: null, max: null, ...values, quantity })}
      part={TargetSchema}
      onSave={onSave}
      onClose={onClose}
    >
      {target ? null : (
        <Select
          label="Quantity"
          value={quantity}
          options={free.map((value) => ({ value, label: quantityName(value, words) }))}
          onChange={setQuantity}
        />
      )}
      {quantity === "bumpSteerDeg" ? (
        <Text variant="small" tone="inkSoft">
          Per wheel, over the band of every ride height.
        </Text>
      ) : null}
    </PartDialog>
  );
}

const styles = StyleSheet.create({
  section: { gap: space.m },
  start: { alignSelf: "flex-start" },
});
