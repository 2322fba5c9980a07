import type { LengthUnit } from "@linkwright/contract";
import type { Axle, RideHeight } from "@linkwright/kinematics";
import { useMemo } from "react";
import { View } from "react-native";
import { linkInWords } from "@/features/safety/index.ts";
import { capitalise } from "@/lib/dialect.ts";
import { formatLength } from "@/lib/format.ts";
import { Notice } from "@/ui/Notice.tsx";
import { Text } from "@/ui/Text.tsx";
import type { TravelRange } from "../series/heights.ts";
import { type LostPart, lostParts } from "../series/lost.ts";
import type { Reading } from "../series/panels.ts";
import { sweepHeight } from "../series/sweepHeight.ts";

interface LostNotesProps {
  readonly axle: Axle;
  readonly height: RideHeight;
  readonly range: TravelRange;
  readonly reading: Reading;
}

/** What of a band the linkage cannot follow: the curve ends there, and so does what the target judges. */
export function LostNotes({ axle, height, range, reading }: LostNotesProps) {
  const parts = useMemo(() => lostParts(sweepHeight(axle, height, range)), [axle, height, range]);
  if (parts.length === 0) return null;
  return (
    <Notice kind="fault" title={`Part of the band at ${height.name} is lost`}>
      <View role="list">
        {parts.map((part) => (
          <View role="listitem" key={`${part.side} ${part.way}`}>
            <Text variant="small">{lostInWords(part, reading)}</Text>
          </View>
        ))}
      </View>
    </Notice>
  );
}

function lostInWords(part: LostPart, { units, words }: Reading): string {
  const side = `${capitalise(part.side)} wheel`;
  const link = linkInWords(part.link, words);
  if (part.way === "whole") return `${side}: this ride height is out of reach; the ${link} runs out.`;
  const at = (mm: number, unit: LengthUnit) => formatLength(mm, unit, { sign: "always" });
  const lost = formatLength(Math.abs(part.asked - part.reached), units);
  return `${side}: the curve ends at ${at(part.reached, units)} of the ${at(part.asked, units)} asked for, ${lost} of ${part.way} are lost; the ${link} runs out.`;
}
