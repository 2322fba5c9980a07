import { StyleSheet, View } from "react-native";
import { type Bench, LinkagePane, type Reading } from "@/features/curves/index.ts";
import { usePreferences } from "@/features/session/index.ts";
import { groupInWords, useStudy } from "@/features/study/index.ts";
import { Button } from "@/ui/Button.tsx";
import { Heading } from "@/ui/Heading.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useStep } from "../entry/useStep.ts";
import { SetupSection } from "../setup/SetupSection.tsx";
import { SECTIONS, type SectionId } from "../setup/sections.ts";
import { type Place, usePlace } from "../usePlace.ts";
import { usePointRows } from "../usePointRows.ts";
import { BumpSteerLine } from "./BumpSteerLine.tsx";
import { PointEditor } from "./PointEditor.tsx";
import { PointList } from "./PointList.tsx";
import { ReadOnlyNote } from "./ReadOnlyNote.tsx";
import { StepChoice } from "./StepChoice.tsx";

interface PhonePointsProps {
  readonly bench: Bench | null;
  readonly reading: Reading;
}

/** One thing a screen: the list, one point, or one part of the set-up. */
export function PhonePoints({ bench, reading }: PhonePointsProps) {
  const place = usePlace();
  if (place.point !== null) return <OnePoint bench={bench} reading={reading} place={place} />;
  if (place.section !== null) return <OneSection section={place.section} reading={reading} place={place} />;
  return (
    <View style={styles.page}>
      <ReadOnlyNote />
      <PointList place={place} units={reading.units} />
    </View>
  );
}

const PICTURE = 240;

function OnePoint({ bench, reading, place }: PhonePointsProps & { place: Place }) {
  const { units } = reading;
  const { mayEdit } = useStudy();
  const { words } = usePreferences();
  const [step, chooseStep] = useStep(units);
  const { rows, chosen, onEnter, onPutBack } = usePointRows(place.point);
  if (chosen === null) return <PointList place={place} units={units} />;
  const at = rows.indexOf(chosen);
  const next = rows[(at + 1) % rows.length] ?? chosen;
  const last = rows[(at + rows.length - 1) % rows.length] ?? chosen;
  return (
    <View>
      <View style={styles.bar}>
        <Button kind="quiet" label="All points" onPress={place.openList} />
        <View style={styles.pair}>
          <Button
            kind="quiet"
            label="Previous"
            accessibleLabel={`Previous point: ${groupInWords(last.group, words)}, ${last.label}`}
            onPress={() => place.openPoint(last.path)}
          />
          <Button
            kind="quiet"
            label="Next"
            accessibleLabel={`Next point: ${groupInWords(next.group, words)}, ${next.label}`}
            onPress={() => place.openPoint(next.path)}
          />
        </View>
      </View>
      {bench ? (
        <LinkagePane
          axle={bench.axle}
          heights={bench.heights}
          units={units}
          highlight={place.point}
          onPick={place.openPoint}
          height={PICTURE}
          steerable={false}
        />
      ) : null}
      <View style={styles.point}>
        <Heading level={2} variant="block">{`${groupInWords(chosen.group, words)}, ${chosen.label}`}</Heading>
        <ReadOnlyNote />
        {bench ? <BumpSteerLine bench={bench} reading={reading} /> : null}
        {mayEdit ? <StepChoice units={units} step={step} onChoose={chooseStep} /> : null}
        <PointEditor
          row={chosen}
          units={units}
          step={step.size}
          isLocked={!mayEdit}
          onEnter={onEnter}
          onPutBack={onPutBack}
        />
      </View>
    </View>
  );
}

interface OneSectionProps {
  readonly section: SectionId;
  readonly reading: Reading;
  readonly place: Place;
}

function OneSection({ section, reading, place }: OneSectionProps) {
  return (
    <View style={styles.page}>
      <Button label="All points and set-up" onPress={place.openList} style={styles.back} />
      <Heading level={2}>{SECTIONS.find(({ id }) => id === section)?.title}</Heading>
      <ReadOnlyNote />
      <SetupSection id={section} units={reading.units} />
    </View>
  );
}

const styles = StyleSheet.create({
  page: { padding: space.l, gap: space.l },
  point: { paddingHorizontal: space.l, paddingVertical: space.m, gap: space.m },
  bar: { flexDirection: "row", justifyContent: "space-between", backgroundColor: color.panel },
  pair: { flexDirection: "row" },
  back: { alignSelf: "flex-start" },
});
