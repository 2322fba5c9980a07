import type { LengthUnit } from "@linkwright/contract";
import type { ReactNode } from "react";
import { StyleSheet, View } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { groupInWords } from "@/features/study/index.ts";
import { formatLengthFigure } from "@/lib/format.ts";
import { DomButton } from "@/ui/dom.tsx";
import { Heading } from "@/ui/Heading.tsx";
import { PunchMark } from "@/ui/PunchMark.tsx";
import { Sign } from "@/ui/Sign.tsx";
import { Figure, Text } from "@/ui/Text.tsx";
import { color, space, touch } from "@/ui/theme/tokens.ts";
import type { PointRow } from "../entry/rows.ts";
import { SECTIONS } from "../setup/sections.ts";
import type { Place } from "../usePlace.ts";
import { usePointRows } from "../usePointRows.ts";
import { SideBar } from "./SideBar.tsx";

/** On a phone: every hardpoint and every part of the set-up, each leading to its own page. */
export function PointList({ place, units }: { place: Place; units: LengthUnit }) {
  const { groups } = usePointRows(null);
  const { words } = usePreferences();
  return (
    <View style={styles.list}>
      <SideBar />
      {groups.map(({ group, rows }) => (
        <View key={group}>
          <Heading level={2} variant="tableHead" style={styles.group}>
            {groupInWords(group, words)}
          </Heading>
          {rows.map((row) => (
            <Row
              key={row.path}
              name={`${groupInWords(group, words)}, ${row.label}`}
              onPress={() => place.openPoint(row.path)}
            >
              <PointSummary row={row} units={units} />
            </Row>
          ))}
        </View>
      ))}
      <View>
        <Heading level={2} variant="tableHead" style={styles.group}>
          Set-up
        </Heading>
        {SECTIONS.map(({ id, title }) => (
          <Row key={id} name={title} onPress={() => place.openSection(id)}>
            <Text style={styles.label}>{title}</Text>
          </Row>
        ))}
      </View>
    </View>
  );
}

function PointSummary({ row, units }: { row: PointRow; units: LengthUnit }) {
  const figures = row.shown.map((mm) => formatLengthFigure(mm, units)).join("  ");
  return (
    <>
      {row.kept ? <Sign kind="fault" /> : <PunchMark />}
      <Text style={styles.label}>{row.label}</Text>
      <Figure variant="figureSmall" tone={row.kept ? "fault" : "inkSoft"}>
        {figures}
      </Figure>
    </>
  );
}

function Row({ name, onPress, children }: { name: string; onPress: () => void; children: ReactNode }) {
  return (
    <DomButton className="row-link" aria-label={name} onClick={onPress} style={styles.row}>
      {children}
      <svg aria-hidden="true" width="8" height="14" viewBox="0 0 8 14">
        <path d="M1 1l6 6-6 6" fill="none" stroke={color.inkSoft} strokeWidth="1.6" />
      </svg>
    </DomButton>
  );
}

const styles = StyleSheet.create({
  list: { gap: space.l },
  group: { paddingBottom: space.xs },
  row: {
    display: "flex",
    flexDirection: "row",
    alignItems: "center",
    gap: space.s,
    minHeight: touch + 4,
    width: "100%",
    paddingHorizontal: space.xs,
    paddingVertical: 0,
    borderWidth: 0,
    borderTopWidth: 1,
    borderStyle: "solid",
    borderColor: color.rule,
    backgroundColor: "transparent",
    textAlign: "left",
    cursor: "pointer",
  } as object,
  label: { flex: 1 },
});
