import type { LengthUnit } from "@linkwright/contract";
import { memo, useEffect, useId, useRef } from "react";
import { StyleSheet, View } from "react-native";
import { lengthDecimals, lengthFromMm, mmFromLength } from "@/lib/format.ts";
import { Button } from "@/ui/Button.tsx";
import { cssClass, DomButton, DomTableCell, DomTableHeadCell, DomTableRow } from "@/ui/dom.tsx";
import { PunchMark } from "@/ui/PunchMark.tsx";
import { Sign } from "@/ui/Sign.tsx";
import { Text } from "@/ui/Text.tsx";
import { color, space, type } from "@/ui/theme/tokens.ts";
import { useNumberEntry } from "@/ui/useNumberEntry.ts";
import type { Kept } from "../entry/attempt.ts";
import { AXIS_NAMES, type AxisIndex, fieldOf } from "../entry/rows.ts";
import { CoordinateCell } from "./CoordinateCell.tsx";

export interface PointHandlers {
  readonly onSelect: (hardpoint: string) => void;
  readonly onEnter: (hardpoint: string, axis: AxisIndex, mm: number) => void;
  readonly onPutBack: (hardpoint: string) => void;
}

interface PointTableRowProps extends PointHandlers {
  readonly hardpoint: string;
  /** "Lower arm, front pivot". */
  readonly name: string;
  readonly label: string;
  readonly x: number;
  readonly y: number;
  readonly z: number;
  readonly kept: Kept | undefined;
  readonly units: LengthUnit;
  readonly step: number;
  readonly isSelected: boolean;
  readonly isLocked: boolean;
}

/** One hardpoint with its three fields; what is wrong with them stands in a line below, as wide as the table. */
export const PointTableRow = memo(function PointTableRow(props: PointTableRowProps) {
  const { hardpoint, name, label, kept, isSelected, isLocked, onSelect, onPutBack } = props;
  const messageId = useId();
  const rowRef = useRef<HTMLTableRowElement>(null);
  const entries = [useCoordinate(props, 0), useCoordinate(props, 1), useCoordinate(props, 2)] as const;
  useEffect(() => {
    if (isSelected) rowRef.current?.scrollIntoView({ block: "nearest" });
  }, [isSelected]);
  const message = kept
    ? `${kept.issue.problem} ${kept.issue.hint}`
    : entries.map((entry) => entry.message).find(Boolean);
  const values = [props.x, props.y, props.z] as const;
  return (
    <>
      <DomTableRow
        ref={rowRef}
        style={[cssClass("table-row"), isSelected && styles.selected]}
        aria-selected={isSelected}
        onFocus={() => onSelect(hardpoint)}
      >
        <DomTableHeadCell scope="row" style={styles.head}>
          <DomButton
            aria-label={`${name}: show it in the picture`}
            aria-pressed={isSelected}
            onClick={() => onSelect(hardpoint)}
            style={[type.small, styles.name]}
          >
            <PunchMark tone={isSelected ? "dye" : "ink"} />
            {label}
          </DomButton>
        </DomTableHeadCell>
        {([0, 1, 2] as const).map((axis) => (
          <CoordinateCell
            key={AXIS_NAMES[axis]}
            label={`${name}, ${AXIS_NAMES[axis]}`}
            entry={entries[axis]}
            value={values[axis]}
            isInvalid={entries[axis].message !== undefined || kept?.field === fieldOf(hardpoint, axis)}
            messageId={messageId}
            isLocked={isLocked}
          />
        ))}
      </DomTableRow>
      {message ? (
        <DomTableRow>
          <DomTableCell colSpan={4} style={styles.messageCell}>
            <View nativeID={messageId} role="alert" style={styles.message}>
              <Sign kind="fault" size={16} />
              <Text variant="small" tone="fault" style={styles.words}>
                {message}
              </Text>
              {kept ? (
                <Button
                  label="Put back"
                  accessibleLabel={`Put ${name} back as it is drawn`}
                  onPress={() => onPutBack(hardpoint)}
                />
              ) : null}
            </View>
          </DomTableCell>
        </DomTableRow>
      ) : null}
    </>
  );
});

function useCoordinate(props: PointTableRowProps, axis: AxisIndex) {
  const { hardpoint, units, step, onEnter } = props;
  const mm = [props.x, props.y, props.z][axis] as number;
  return useNumberEntry({
    value: lengthFromMm(mm, units),
    decimals: lengthDecimals(units),
    step,
    onCommit: (shown) => onEnter(hardpoint, axis, mmFromLength(shown, units)),
  });
}

const styles = StyleSheet.create({
  selected: { backgroundColor: color.dyeWash },
  head: {
    padding: 0,
    textAlign: "left",
    fontWeight: "400",
    borderBottomWidth: 1,
    borderBottomStyle: "solid",
    borderBottomColor: color.rule,
  } as object,
  name: {
    display: "flex",
    flexDirection: "row",
    alignItems: "center",
    gap: space.s,
    minHeight: 34,
    width: "100%",
    padding: 0,
    borderWidth: 0,
    backgroundColor: "transparent",
    color: color.ink,
    textAlign: "left",
    cursor: "pointer",
  } as object,
  messageCell: { padding: 0 },
  message: {
    flexDirection: "row",
    alignItems: "flex-start",
    gap: space.s,
    padding: space.s,
    backgroundColor: color.faultWash,
    borderLeftWidth: 3,
    borderLeftColor: color.fault,
  },
  words: { flex: 1 },
});
