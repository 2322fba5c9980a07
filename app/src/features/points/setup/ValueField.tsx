import { type LengthUnit, readAt } from "@linkwright/contract";
import type { Path } from "@linkwright/kinematics";
import { StyleSheet, View } from "react-native";
import { useStudy } from "@/features/study/index.ts";
import { Button } from "@/ui/Button.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { StepperRow } from "../components/StepperRow.tsx";
import { keptAt } from "../entry/attempt.ts";
import { useEntry } from "../entry/EntryProvider.tsx";
import { decimalsFor, type FieldKind, shownFrom, stepFor, unitFor, valueFrom } from "../form/fieldKinds.ts";

interface ValueFieldProps {
  /** In the study document. */
  readonly path: Path;
  readonly label: string;
  readonly help?: string;
  readonly kind: FieldKind;
  readonly units: LengthUnit;
  /** May be taken away. */
  readonly optional?: boolean;
}

/** One number of the document, live: every step re-solves. What cannot be built stays in the field with the reason. */
export function ValueField({ path, label, help, kind, units, optional }: ValueFieldProps) {
  const { study, mayEdit } = useStudy();
  const { kept, enter, putBack } = useEntry();
  const held = keptAt(kept, path);
  const value = (held ? held.change.to : readAt(study, path)) as number | undefined;
  const unit = unitFor(kind, units);
  const field = path.join(".");
  return (
    <View style={styles.field}>
      <StepperRow
        label={label}
        help={help}
        value={value === undefined ? null : shownFrom(value, kind, units)}
        decimals={decimalsFor(kind, units)}
        step={stepFor(kind, units)}
        unit={unit === "" ? undefined : unit}
        disabled={!mayEdit}
        error={held && `${held.issue.problem} ${held.issue.hint}`}
        onCommit={(shown) => enter(path, valueFrom(shown, kind, units), field)}
      />
      {held ? (
        <Button
          label="Put back"
          accessibleLabel={`${label}: put back as it is drawn`}
          onPress={() => putBack(path)}
          style={styles.button}
        />
      ) : null}
      {optional && value !== undefined && mayEdit && !held ? (
        <Button
          kind="quiet"
          label="Remove"
          accessibleLabel={`${label}: remove`}
          onPress={() => enter(path, undefined, field)}
          style={styles.button}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  field: { gap: space.xs },
  button: { alignSelf: "flex-start" },
});
