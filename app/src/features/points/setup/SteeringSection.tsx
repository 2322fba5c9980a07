import { AxleSchema, type LengthUnit } from "@linkwright/contract";
import type { RackSteering } from "@linkwright/kinematics";
import { useState } from "react";
import { StyleSheet, View } from "react-native";
import { type EditValue, useStudy } from "@/features/study/index.ts";
import { Button } from "@/ui/Button.tsx";
import { Checkbox } from "@/ui/Checkbox.tsx";
import { Choice } from "@/ui/Choice.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { issuesWith } from "../entry/attempt.ts";
import { useEntry } from "../entry/EntryProvider.tsx";
import type { FormField } from "../form/formSchema.ts";
import { PartDialog } from "../form/PartDialog.tsx";
import { DirectionField } from "./DirectionField.tsx";
import { ValueField } from "./ValueField.tsx";

const PATH = ["axle", "steering"];

/** The rack as it is mounted, or a toe link that nothing steers. */
export function SteeringSection({ units }: { units: LengthUnit }) {
  const { study } = useStudy();
  const { steering } = study.axle;
  return steering.type === "rack" ? <Rack steering={steering} units={units} /> : <Fixed units={units} />;
}

const NOT_STATED = "notStated";

function Rack({ steering, units }: { steering: RackSteering; units: LengthUnit }) {
  const { mayEdit, changeValue } = useStudy();
  const { enter } = useEntry();
  return (
    <View style={styles.fields}>
      <fieldset disabled={!mayEdit} style={BARE}>
        <View style={styles.fields}>
          <Choice
            label="Turning left moves the rack"
            value={steering.wheelLeftMoves ?? NOT_STATED}
            options={[
              { value: "left", label: "To the left" },
              { value: "right", label: "To the right" },
              { value: NOT_STATED, label: "Not stated" },
            ]}
            onChange={(way) =>
              enter([...PATH, "wheelLeftMoves"], way === NOT_STATED ? undefined : way, "wheelLeftMoves")
            }
          />
          <Text variant="small" tone="inkSoft">
            As the part is mounted in this car, seen by the driver.
          </Text>
          <Checkbox
            label="The rack is a bought part: its inner joints keep their distance"
            isChecked={steering.bought === true}
            onChange={(isBought) => enter([...PATH, "bought"], isBought, "bought")}
          />
        </View>
      </fieldset>
      <ValueField
        path={[...PATH, "travel"]}
        label="Rack travel"
        help="From centre to either lock"
        kind="length"
        units={units}
      />
      <ValueField
        path={[...PATH, "mmPerTurn"]}
        label="Rack travel per turn"
        help="Of the steering wheel"
        kind="length"
        units={units}
        optional
      />
      <DirectionField
        path={[...PATH, "axis"]}
        label="Direction of the rack"
        help="0, 1, 0 is square to the car"
      />
      {mayEdit ? (
        <Button
          kind="quiet"
          label="Make it a fixed toe link"
          onPress={() => changeValue(PATH, { type: "fixed" })}
          style={styles.start}
        />
      ) : null}
    </View>
  );
}

const RACK: readonly FormField[] = [
  { name: "travel", label: "Rack travel", help: "From centre to either lock", kind: "length" },
];
const [RackSchema] = AxleSchema.shape.steering.options;

function Fixed({ units }: { units: LengthUnit }) {
  const { study, mayEdit, changeValue } = useStudy();
  const [isOpen, setIsOpen] = useState(false);
  const save = (rack: RackSteering) => {
    const to = { ...rack, axis: [...rack.axis] } as unknown as EditValue;
    const issues = issuesWith(study, [{ path: PATH, to }]);
    if (issues.length === 0) changeValue(PATH, to);
    return issues;
  };
  return (
    <View style={styles.fields}>
      <Text>A fixed toe link: its inner joint stays on the body and nothing steers.</Text>
      {mayEdit ? (
        <Button label="Give it a rack" onPress={() => setIsOpen(true)} style={styles.start} />
      ) : null}
      {isOpen ? (
        <PartDialog
          title="Give it a rack"
          intro="The rack lies square to the car through the inner joints as they are drawn. Which way it moves, and whether it is a bought part, is stated next."
          fields={RACK}
          given={{}}
          units={units}
          shape={(values) => ({ type: "rack", axis: [0, 1, 0], ...values })}
          part={RackSchema}
          onSave={save}
          onClose={() => setIsOpen(false)}
        />
      ) : null}
    </View>
  );
}

/** A fieldset without the browser's frame. */
const BARE = { border: 0, margin: 0, padding: 0, minWidth: 0 } as const;

const styles = StyleSheet.create({
  fields: { gap: space.m },
  start: { alignSelf: "flex-start" },
});
