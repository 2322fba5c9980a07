// The hardpoint table as CSV: what a fabricator sets the jig by. Pure: the same revision gives the same bytes.

import { CAUTIONS, type LengthUnit, type RevisionStatus, shortHash } from "@linkwright/contract";
import { type Coordinates, listHardpoints, pointInDatum, type Study } from "@linkwright/kinematics";
import Papa from "papaparse";

export interface HardpointTable {
  readonly workshopName: string;
  readonly buildName: string;
  readonly studyName: string;
  readonly study: Study;
  readonly revision: number;
  readonly revisionDate: Date;
  readonly status: RevisionStatus;
  readonly hash: string;
  readonly units: LengthUnit;
}

const MM_PER_INCH = 25.4;
/** A hundredth of what a jig can hold in either unit. */
const DECIMALS: Readonly<Record<LengthUnit, number>> = { mm: 3, inch: 4 };

/** A spreadsheet would run a cell that begins like this as a formula; a plain number is let through. */
const FORMULA = /^(?:[=+@\t\r\n]|-(?!\d+(?:\.\d+)?$))/;
/** Spreadsheets take a file for UTF-8 only when it says so. */
const BYTE_ORDER_MARK = "\uFEFF";

const STATUS_WORDS: Readonly<Record<RevisionStatus, string>> = {
  saved: "saved, not reviewed",
  inReview: "in review",
  changesAsked: "changes asked for",
  approved: "approved",
  released: "released",
  superseded: "superseded by a later revision",
};

export function writeHardpointTable(table: HardpointTable): string {
  const rows = [...heading(table), [], ...points(table), [], ...cautions()];
  return BYTE_ORDER_MARK + Papa.unparse(rows, { escapeFormulae: FORMULA, newline: "\r\n" });
}

/** `hill-climb-special_front-axle_rev-3_mm_NOT-RELEASED.csv` */
export function nameHardpointTable(table: HardpointTable): string {
  const parts = [slug(table.buildName), slug(table.studyName), `rev-${table.revision}`, table.units];
  return `${[...parts, ...(isReleased(table) ? [] : ["NOT-RELEASED"])].join("_")}.csv`;
}

function heading(table: HardpointTable): string[][] {
  const { study, units } = table;
  return [
    ["Hardpoint table"],
    ...(isReleased(table) ? [] : [["NOT RELEASED", "Not to be built from until the revision is released."]]),
    ["Workshop", table.workshopName],
    ["Build", table.buildName],
    ["Study", table.studyName],
    ["Axle", `${study.axle.name} (${study.axle.position})`],
    ["Revision", String(table.revision)],
    ["Date", table.revisionDate.toISOString().slice(0, 10)],
    ["Status", STATUS_WORDS[table.status]],
    ["Hash", shortHash(table.hash)],
    ["Units", units],
    ["Datum", ...datumWords(study)],
    ["Position", "design ride height, steering straight ahead"],
  ];
}

function datumWords({ datum }: Study): string[] {
  const plain = "X forward, Y left, Z up";
  return datum === null
    ? [`the car's own axes: ${plain}`]
    : [datum.name, "X, Y and Z along the datum's axes"];
}

function points({ study, units }: HardpointTable): string[][] {
  const head = ["Side", "Part", "Point", `X (${units})`, `Y (${units})`, `Z (${units})`];
  const rows = listHardpoints(study.axle).map(({ side, group, label, point }) => [
    side,
    group,
    label,
    ...lengths(pointInDatum(study.datum, point), units),
  ]);
  return [head, ...rows];
}

function lengths(point: Coordinates, units: LengthUnit): string[] {
  return point.map((mm) => {
    const text = (units === "mm" ? mm : mm / MM_PER_INCH).toFixed(DECIMALS[units]);
    return Number(text) === 0 ? text.replace("-", "") : text;
  });
}

function cautions(): string[][] {
  return [["Cautions"], ...CAUTIONS.map(({ title, text }) => [title, text])];
}

function isReleased({ status }: HardpointTable): boolean {
  return status === "released";
}

function slug(name: string): string {
  const plain = name
    .normalize("NFKD")
    .replace(/\p{M}/gu, "")
    .replace(/[^A-Za-z0-9]+/g, "-")
    .replace(/^-|-$/g, "");
  return plain.slice(0, 60).toLowerCase() || "unnamed";
}
