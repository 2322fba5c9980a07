import { whyNotMove } from "@linkwright/kinematics";
import { useMemo } from "react";
import { StyleSheet, View } from "react-native";
import type { Reading } from "@/features/curves/index.ts";
import { StepChoice, useStep } from "@/features/points/index.ts";
import { Heading } from "@/ui/Heading.tsx";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { moveWords } from "../flattenWords.ts";
import { OFFERED_MOVES } from "../moves.ts";
import type { FlattenBench } from "../useFlatten.ts";
import { MoveRow } from "./MoveRow.tsx";

/** The moves, each a change to the drawing that is not made until it is applied. */
export function MovesPanel({ bench, reading }: { bench: FlattenBench; reading: Reading }) {
  const { axle, settings, dispatch, issues } = bench;
  const { units } = reading;
  const [step, chooseStep] = useStep(units);
  const head = useMemo(
    () => (
      <View style={styles.head}>
        <Heading level={2} variant="block">
          Moves
        </Heading>
        <StepChoice units={units} step={step} onChoose={chooseStep} />
      </View>
    ),
    [units, step, chooseStep],
  );
  return (
    <View style={styles.panel}>
      {head}
      <View>
        {OFFERED_MOVES.map((move) => (
          <MoveRow
            key={move}
            move={move}
            {...moveWords(move, axle.steering)}
            setting={settings[move]}
            whyNot={whyNotMove(axle, move)}
            units={units}
            step={step.size}
            dispatch={dispatch}
          />
        ))}
      </View>
      {issues.length > 0 ? (
        <Notice kind="fault" live title="The axle cannot be built with these moves">
          {issues.map(({ problem, hint }) => (
            <Text key={problem} variant="small">{`${problem} ${hint}`}</Text>
          ))}
        </Notice>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space.s },
  head: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", justifyContent: "space-between" },
});
