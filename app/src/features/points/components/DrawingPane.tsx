import type { LengthUnit } from "@linkwright/contract";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { groupInWords, useStudy } from "@/features/study/index.ts";
import { Choice } from "@/ui/Choice.tsx";
import { Heading } from "@/ui/Heading.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useStep } from "../entry/useStep.ts";
import { SetupSection } from "../setup/SetupSection.tsx";
import { SECTIONS } from "../setup/sections.ts";
import type { Place } from "../usePlace.ts";
import { usePointRows } from "../usePointRows.ts";
import { PointEditor } from "./PointEditor.tsx";
import { PointTable } from "./PointTable.tsx";
import { ReadOnlyNote } from "./ReadOnlyNote.tsx";
import { SideBar } from "./SideBar.tsx";
import { StepChoice } from "./StepChoice.tsx";

interface DrawingPaneProps {
  readonly place: Place;
  readonly units: LengthUnit;
}

/** The left pane of a wide screen: the hardpoint table, or the rest of the drawing. */
export function DrawingPane({ place, units }: DrawingPaneProps) {
  const { section, openSection, openList } = place;
  return (
    <View style={styles.pane}>
      <View style={styles.top}>
        <Choice
          label="What is edited"
          hideLabel
          value={section === null ? "points" : "setup"}
          options={[
            { value: "points", label: "Hardpoints" },
            { value: "setup", label: "Set-up" },
          ]}
          onChange={(value) => (value === "points" ? openList() : openSection(SECTIONS[0].id))}
        />
        <ReadOnlyNote />
      </View>
      {section === null ? <Points place={place} units={units} /> : <Setup units={units} />}
    </View>
  );
}

function Points({ place, units }: DrawingPaneProps) {
  const { mayEdit } = useStudy();
  const { words } = usePreferences();
  const [step, chooseStep] = useStep(units);
  const { groups, chosen, onEnter, onPutBack } = usePointRows(place.point);
  const isLocked = !mayEdit;
  return (
    <>
      <View style={styles.table}>
        <SideBar />
        {mayEdit ? <StepChoice units={units} step={step} onChoose={chooseStep} /> : null}
        <PointTable
          groups={groups}
          selected={chosen?.path ?? null}
          units={units}
          step={step.size}
          isLocked={isLocked}
          onSelect={place.openPoint}
          onEnter={onEnter}
          onPutBack={onPutBack}
        />
      </View>
      {mayEdit ? (
        <View style={styles.editor}>
          {chosen ? (
            <>
              <Heading level={2} variant="block">
                {`${groupInWords(chosen.group, words)}, ${chosen.label}`}
              </Heading>
              <PointEditor
                row={chosen}
                units={units}
                step={step.size}
                isLocked={isLocked}
                onEnter={onEnter}
                onPutBack={onPutBack}
              />
            </>
          ) : (
            <Text variant="small" tone="inkSoft">
              Choose a point in the table or in the picture to move it with large steppers.
            </Text>
          )}
        </View>
      ) : null}
    </>
  );
}

function Setup({ units }: { units: LengthUnit }) {
  return (
    <View style={styles.setup}>
      {SECTIONS.map(({ id, title }) => (
        <View key={id} role="region" aria-label={title} style={styles.section}>
          <Heading level={2} variant="block">
            {title}
          </Heading>
          <SetupSection id={id} units={units} />
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  pane: { flex: 1, minHeight: 420, backgroundColor: color.panel },
  top: { padding: space.l, paddingBottom: space.s, gap: space.m },
  table: {
    flex: 1,
    minHeight: 160,
    overflowY: "auto",
    paddingHorizontal: space.l,
    paddingBottom: space.l,
    gap: space.s,
  } as object,
  editor: {
    gap: space.s,
    paddingHorizontal: space.l,
    paddingVertical: space.m,
    backgroundColor: color.panel,
    borderTopWidth: 1,
    borderTopColor: color.rule,
  },
  setup: { flex: 1, overflowY: "auto", paddingHorizontal: space.l, paddingBottom: space.xl } as object,
  section: { gap: space.m, paddingVertical: space.l, borderTopWidth: 1, borderTopColor: color.rule },
});
