import { memo } from "react";
import { StyleSheet, View } from "react-native";
import { DomButton } from "../../ui/dom.tsx";
import { Text } from "../../ui/Text.tsx";
import { corner, dyedSteel, space, touch } from "../../ui/theme/tokens.ts";
import { VIEWS, type ViewName } from "./viewPlaces.ts";

interface ViewButtonsProps {
  /** The view as chosen; null once it was turned by hand. */
  readonly settled: ViewName | null;
  readonly tieRod: string;
  /** Short words, where the long ones would take a second line of the picture. */
  readonly isNarrow: boolean;
  readonly onView: (view: ViewName) => void;
}

interface Words {
  readonly long: string;
  /** Part of the long words, so that what is seen is also what is said. */
  readonly short: string;
}

function wordsOf(tieRod: string): Readonly<Record<ViewName, Words>> {
  return {
    front: { long: "Front", short: "Front" },
    side: { long: "Side", short: "Side" },
    top: { long: "Top", short: "Top" },
    threeQuarter: { long: "Three-quarter", short: "Quarter" },
    alongTieRod: { long: `Along the ${tieRod}`, short: tieRod },
  };
}

export const ViewButtons = memo(function ViewButtons({
  settled,
  tieRod,
  isNarrow,
  onView,
}: ViewButtonsProps) {
  const words = wordsOf(tieRod);
  return (
    <View role="group" aria-label="View" style={styles.row}>
      {VIEWS.map((view) => {
        const { long, short } = words[view];
        const isChosen = view === settled;
        return (
          <DomButton
            key={view}
            aria-label={long}
            aria-pressed={isChosen}
            onClick={() => onView(view)}
            style={[styles.button, isNarrow && styles.narrow, isChosen && styles.chosen]}
          >
            <Text variant="label" style={[styles.word, isChosen && styles.chosenWord]}>
              {isNarrow ? short : long}
            </Text>
          </DomButton>
        );
      })}
    </View>
  );
});

const styles = StyleSheet.create({
  row: { flexDirection: "row", gap: space.xs + space.hair },
  button: {
    minHeight: touch,
    minWidth: touch,
    paddingHorizontal: space.m,
    borderWidth: 1,
    borderStyle: "solid",
    borderColor: dyedSteel.edge,
    borderRadius: corner,
    backgroundColor: dyedSteel.ground,
    cursor: "pointer",
    boxSizing: "border-box",
  },
  narrow: { flex: 1, paddingHorizontal: space.hair },
  chosen: { backgroundColor: dyedSteel.dye, borderColor: dyedSteel.dye },
  word: { color: dyedSteel.ink, textAlign: "center" },
  chosenWord: { color: dyedSteel.onDye },
});
