import type { RideHeight } from "@linkwright/kinematics";
import { StyleSheet, View } from "react-native";
import { capitalise } from "@/lib/dialect.ts";
import { Choice } from "@/ui/Choice.tsx";
import { space } from "@/ui/theme/tokens.ts";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { usePose } from "../pose/PoseProvider.tsx";
import type { Reading } from "../series/panels.ts";
import { QUANTITIES, type Quantity } from "../series/sweepHeight.ts";
import type { ToeDisplay } from "../series/toeDisplay.ts";
import { HeightChoice } from "./HeightChoice.tsx";
import { ToeChoice } from "./ToeChoice.tsx";

interface CurvesHeadProps {
  readonly heights: readonly RideHeight[];
  readonly reading: Reading;
  /** Absent where the choice stands elsewhere. */
  readonly onToe?: (toe: ToeDisplay) => void;
  /** What is shown where there is room for one quantity only. */
  readonly quantity: Quantity;
  readonly onQuantity: (quantity: Quantity) => void;
}

/** Which ride height, which quantity, and how toe is told. */
export function CurvesHead({ heights, reading, onToe, quantity, onQuantity }: CurvesHeadProps) {
  const isWide = useIsWide();
  const isEvery = usePose((pose) => pose.isEveryHeight) && heights.length > 1;
  const names: Record<Quantity, string> = {
    toe: "Toe",
    camber: "Camber",
    caster: capitalise(reading.words.caster),
    track: "Track",
  };
  return (
    <View style={styles.head}>
      <HeightChoice heights={heights} withAll />
      {!isWide || isEvery ? (
        <Choice
          label="Quantity"
          hideLabel
          compact={isWide}
          value={quantity}
          options={QUANTITIES.map((value) => ({ value, label: names[value] }))}
          onChange={onQuantity}
        />
      ) : null}
      {onToe ? <ToeChoice reading={reading} onChoose={onToe} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  head: { flexDirection: "row", flexWrap: "wrap", alignItems: "center", gap: space.m },
});
