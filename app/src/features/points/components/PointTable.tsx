import type { LengthUnit } from "@linkwright/contract";
import { Fragment } from "react";
import { StyleSheet } from "react-native";
import { usePreferences } from "@/features/session/index.ts";
import { groupInWords } from "@/features/study/index.ts";
import { DomDiv, DomTable, DomTableBody, DomTableHead, DomTableHeadCell, DomTableRow } from "@/ui/dom.tsx";
import { color, space, type } from "@/ui/theme/tokens.ts";
import { AXIS_NAMES, type PointGroup } from "../entry/rows.ts";
import { type PointHandlers, PointTableRow } from "./PointTableRow.tsx";

interface PointTableProps extends PointHandlers {
  readonly groups: readonly PointGroup[];
  readonly selected: string | null;
  readonly units: LengthUnit;
  readonly step: number;
  readonly isLocked: boolean;
}

const CAPTION = "Hardpoints";

/** The hardpoints as a jig shop writes them: part by part, one line a point, one column an axis. */
export function PointTable({ groups, selected, units, step, isLocked, ...handlers }: PointTableProps) {
  const { words } = usePreferences();
  return (
    <DomDiv style={styles.scroller as object}>
      <DomTable style={styles.table as object}>
        <caption className="visually-hidden">{CAPTION}</caption>
        <DomTableHead>
          <DomTableRow>
            {["Point", ...AXIS_NAMES].map((head, at) => (
              <DomTableHeadCell
                key={head}
                scope="col"
                style={[type.tableHead, styles.head, at > 0 && styles.numeric]}
              >
                {head}
              </DomTableHeadCell>
            ))}
          </DomTableRow>
        </DomTableHead>
        <DomTableBody>
          {groups.map(({ group, rows }) => (
            <Fragment key={group}>
              <DomTableRow>
                <DomTableHeadCell scope="rowgroup" colSpan={4} style={[type.tableHead, styles.group]}>
                  {groupInWords(group, words)}
                </DomTableHeadCell>
              </DomTableRow>
              {rows.map(({ path, label, shown, kept }) => (
                <PointTableRow
                  key={path}
                  {...handlers}
                  hardpoint={path}
                  name={`${groupInWords(group, words)}, ${label}`}
                  label={label}
                  x={shown[0]}
                  y={shown[1]}
                  z={shown[2]}
                  kept={kept}
                  units={units}
                  step={step}
                  isSelected={path === selected}
                  isLocked={isLocked}
                />
              ))}
            </Fragment>
          ))}
        </DomTableBody>
      </DomTable>
    </DomDiv>
  );
}

const styles = StyleSheet.create({
  scroller: { overflowX: "auto", maxWidth: "100%" } as object,
  table: { width: "100%", borderCollapse: "collapse", borderSpacing: 0, tableLayout: "auto" } as object,
  head: {
    textAlign: "left",
    color: color.inkSoft,
    padding: 0,
    paddingBottom: space.xs,
    fontWeight: "500",
    whiteSpace: "nowrap",
  } as object,
  numeric: { textAlign: "right", paddingRight: 5, width: 76 },
  group: {
    textAlign: "left",
    color: color.ink,
    padding: 0,
    paddingTop: space.m,
    paddingBottom: space.hair,
  } as object,
});
