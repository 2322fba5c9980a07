import type { Axle } from "@linkwright/kinematics";
import { useId, useMemo, useState } from "react";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { formatCount } from "@/lib/format.ts";
import { Button } from "@/ui/Button.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space } from "@/ui/theme/tokens.ts";
import { useIsMedium } from "@/ui/useMediaQuery.ts";
import { FaultList } from "./FaultList.tsx";
import { FaultSign } from "./FaultSign.tsx";
import { useKnownFaults } from "./FaultsProvider.tsx";
import { type FaultPlace, type FaultReport, type NamedBand, reportFaults } from "./reports.ts";

interface SafetyBannerProps {
  readonly axle: Axle;
  readonly heights: readonly NamedBand[];
  /** Takes the person to the wheel travel and lock where a fault lies; without it the place is only told. */
  readonly onShow?: (place: FaultPlace) => void;
}

/** What can kill, across the head of every study screen. Nothing is drawn while nothing is wrong. */
export function SafetyBanner({ axle, heights, onShow }: SafetyBannerProps) {
  const { units, words } = usePreferences();
  const faults = useKnownFaults();
  const reports = useMemo(
    () => reportFaults(faults, { axle, heights, units, words }),
    [faults, axle, heights, units, words],
  );
  return reports.length > 0 ? <Banner reports={reports} onShow={onShow} /> : null;
}

interface BannerProps {
  readonly reports: readonly FaultReport[];
  readonly onShow: ((place: FaultPlace) => void) | undefined;
}

function Banner({ reports, onShow }: BannerProps) {
  const [isOpen, setIsOpen] = useState(false);
  const isMedium = useIsMedium();
  const listId = useId();
  const [worst] = reports;
  if (worst === undefined) return null;
  const show = (place: FaultPlace) => {
    setIsOpen(false);
    onShow?.(place);
  };
  const isRed = worst.severity === "red";
  const others = reports.length - 1;
  return (
    <View role="region" aria-label="Safety">
      <View style={[styles.strip, isRed ? styles.red : styles.amber]}>
        <FaultSign severity={worst.severity} />
        <View role="alert" style={styles.words}>
          <Text variant="strong" tone={isRed ? "onFault" : "amber"}>
            {worst.title}
          </Text>
          {isMedium && isRed ? (
            <Text variant="small" tone="onFault">
              {worst.where ?? worst.meaning}
            </Text>
          ) : null}
          {others > 0 ? (
            <Text variant="small" tone={isRed ? "onFault" : "inkSoft"}>
              {`and ${formatCount(others, "more", "more")}`}
            </Text>
          ) : null}
        </View>
        <Button
          label={isOpen ? "Close" : "What to do"}
          expanded={isOpen}
          controls={listId}
          onPress={() => setIsOpen(!isOpen)}
          style={styles.button}
        />
      </View>
      <View nativeID={listId}>{isOpen ? <FaultList reports={reports} onShow={onShow && show} /> : null}</View>
    </View>
  );
}

const styles = StyleSheet.create({
  strip: {
    flexDirection: "row",
    alignItems: "center",
    gap: space.m,
    paddingHorizontal: space.l,
    paddingVertical: space.s,
    borderBottomWidth: 1,
  },
  red: { backgroundColor: color.fault, borderBottomColor: color.fault },
  amber: { backgroundColor: color.amberWash, borderBottomColor: color.amber },
  words: { flex: 1, minWidth: 0 },
  button: { flexShrink: 0 },
});
