import type { Axle } from "@linkwright/kinematics";
import { useMemo } from "react";
import { View } from "react-native";
import { usePose } from "../pose/PoseProvider.tsx";
import type { HeightFigures } from "../series/figures.ts";
import { chooseHeight, type TravelRange } from "../series/heights.ts";
import type { Reading } from "../series/panels.ts";
import { FiguresOfHeight } from "./FiguresOfHeight.tsx";
import { LostNotes } from "./LostNotes.tsx";

interface HeightsFiguresProps {
  readonly axle: Axle;
  readonly range: TravelRange;
  readonly figures: readonly HeightFigures[];
  readonly before?: readonly HeightFigures[];
  readonly reading: Reading;
}

/** Bump steer at every ride height in figures, and what of a band is lost. */
export function HeightsFigures({ axle, range, figures, before, reading }: HeightsFiguresProps) {
  const heights = useMemo(() => figures.map(({ height }) => height), [figures]);
  const chosen = chooseHeight(
    heights,
    usePose((pose) => pose.height),
  );
  return (
    <View>
      {figures.map((each, at) => (
        <View key={each.height.name}>
          <FiguresOfHeight
            figures={each}
            before={before?.[at] ?? null}
            reading={reading}
            isChosen={figures.length > 1 && each.height === chosen}
          />
          {isWhole(each) ? null : (
            <LostNotes axle={axle} height={each.height} range={range} reading={reading} />
          )}
        </View>
      ))}
    </View>
  );
}

/** mm. Both sides follow the band to its ends. */
const CLOSE = 1e-6;

function isWhole({ height, curves }: HeightFigures): boolean {
  const [from, to] = height.band;
  return curves.every(
    ({ reached }) => reached !== null && reached[0] <= from + CLOSE && reached[1] >= to - CLOSE,
  );
}
