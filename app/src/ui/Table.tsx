import type { ReactNode } from "react";
import { StyleSheet } from "react-native";
import {
  cssClass,
  DomDiv,
  DomTable,
  DomTableBody,
  DomTableCell,
  DomTableHead,
  DomTableHeadCell,
  DomTableRow,
} from "./dom.tsx";
import { color, space, type } from "./theme/tokens.ts";

interface Column {
  readonly label: string;
  /** Numbers stand right, under a head that does too. */
  readonly numeric?: boolean;
  readonly width?: number;
}

interface TableProps {
  readonly label: string;
  readonly columns: readonly Column[];
  readonly children: ReactNode;
}

/** A native table in a box that scrolls sideways by itself, reachable by keyboard when it does. */
export function Table({ label, columns, children }: TableProps) {
  return (
    <DomDiv role="region" aria-label={label} tabIndex={0} style={styles.scroller as object}>
      <DomTable style={styles.table as object}>
        <caption className="visually-hidden">{label}</caption>
        <DomTableHead>
          <DomTableRow>
            {columns.map((column) => (
              <DomTableHeadCell
                key={column.label}
                scope="col"
                style={[
                  type.tableHead,
                  styles.head,
                  column.numeric && styles.numeric,
                  { width: column.width },
                ]}
              >
                {column.label}
              </DomTableHeadCell>
            ))}
          </DomTableRow>
        </DomTableHead>
        <DomTableBody>{children}</DomTableBody>
      </DomTable>
    </DomDiv>
  );
}

interface RowProps {
  readonly children: ReactNode;
  readonly isChosen?: boolean;
}

export function TableRow({ children, isChosen }: RowProps) {
  return (
    <DomTableRow
      style={[cssClass("table-row"), isChosen && styles.chosen]}
      aria-selected={isChosen || undefined}
    >
      {children}
    </DomTableRow>
  );
}

/** A line across the table that names the rows below it. */
export function TableGroup({ label, span }: { label: string; span: number }) {
  return (
    <DomTableRow>
      <DomTableHeadCell scope="rowgroup" colSpan={span} style={[type.tableHead, styles.group]}>
        {label}
      </DomTableHeadCell>
    </DomTableRow>
  );
}

interface CellProps {
  readonly children?: ReactNode;
  readonly numeric?: boolean;
  /** The cell that names its row. */
  readonly isRowHead?: boolean;
}

export function TableCell({ children, numeric, isRowHead }: CellProps) {
  const style = [numeric ? type.figure : type.body, styles.cell, numeric && styles.numeric];
  if (isRowHead) {
    return (
      <DomTableHeadCell scope="row" style={[...style, styles.rowHead]}>
        {children}
      </DomTableHeadCell>
    );
  }
  return <DomTableCell style={style}>{children}</DomTableCell>;
}

const styles = StyleSheet.create({
  scroller: { overflowX: "auto", maxWidth: "100%" } as object,
  table: { width: "100%", borderCollapse: "collapse", borderSpacing: 0 } as object,
  head: {
    textAlign: "left",
    color: color.inkSoft,
    paddingHorizontal: space.m,
    paddingVertical: space.s,
    borderBottomWidth: 1,
    borderBottomStyle: "solid",
    borderBottomColor: color.rule,
    whiteSpace: "nowrap",
  } as object,
  numeric: { textAlign: "right" },
  group: {
    textAlign: "left",
    color: color.ink,
    paddingHorizontal: space.m,
    paddingTop: space.l,
    paddingBottom: space.xs,
    borderBottomWidth: 1,
    borderBottomStyle: "solid",
    borderBottomColor: color.rule,
  } as object,
  cell: {
    color: color.ink,
    paddingHorizontal: space.m,
    paddingVertical: space.s,
    borderBottomWidth: 1,
    borderBottomStyle: "solid",
    borderBottomColor: color.rule,
    verticalAlign: "middle",
  } as object,
  rowHead: { textAlign: "left", fontWeight: "400" },
  chosen: { backgroundColor: color.dyeWash },
});
