// Numbers → text, in one place: nothing else rounds. The minus is U+2212, as wide as a plus in tabular figures.

import type { LengthUnit } from "@linkwright/contract";

const MINUS = "−";
/** A quantity that makes no sense here; the reason stands beside it. */
export const NO_VALUE = "–";

const MM_PER_INCH = 25.4;

export type SignStyle = "negative" | "always";

interface NumberStyle {
  readonly decimals: number;
  readonly sign?: SignStyle | undefined;
}

export function formatNumber(value: number | null, { decimals, sign = "negative" }: NumberStyle): string {
  if (value === null || !Number.isFinite(value)) return NO_VALUE;
  const digits = Math.abs(value).toFixed(decimals);
  // What rounds to nothing has no sign.
  if (Number(digits) === 0) return digits;
  if (value < 0) return `${MINUS}${digits}`;
  return sign === "always" ? `+${digits}` : digits;
}

// Lengths: documents hold mm; a screen shows and takes the unit of the person.

export function lengthFromMm(mm: number, unit: LengthUnit): number {
  return unit === "inch" ? mm / MM_PER_INCH : mm;
}

export function mmFromLength(length: number, unit: LengthUnit): number {
  return unit === "inch" ? length * MM_PER_INCH : length;
}

export function unitSymbol(unit: LengthUnit): string {
  return unit === "inch" ? "in" : "mm";
}

/** Decimals that show a tenth of a millimetre, or the nearest thing a shop reads in inches. */
export function lengthDecimals(unit: LengthUnit): number {
  return unit === "inch" ? 3 : 1;
}

interface LengthStyle {
  readonly decimals?: number;
  readonly sign?: SignStyle;
}

export function formatLengthFigure(mm: number | null, unit: LengthUnit, style: LengthStyle = {}): string {
  const shown = mm === null ? null : lengthFromMm(mm, unit);
  return formatNumber(shown, { decimals: style.decimals ?? lengthDecimals(unit), sign: style.sign });
}

export function formatLength(mm: number | null, unit: LengthUnit, style: LengthStyle = {}): string {
  const figure = formatLengthFigure(mm, unit, style);
  return figure === NO_VALUE ? figure : `${figure} ${unitSymbol(unit)}`;
}

/** Wheel travel as the rule shows it: bump +, droop −, whole millimetres or hundredths of an inch. */
export function formatTravel(mm: number, unit: LengthUnit): string {
  return formatLengthFigure(mm, unit, { decimals: unit === "inch" ? 2 : 0, sign: "always" });
}

// Angles, in degrees.

export function formatAngle(deg: number | null, style: Partial<NumberStyle> = {}): string {
  const figure = formatNumber(deg, { decimals: style.decimals ?? 2, sign: style.sign });
  return figure === NO_VALUE ? figure : `${figure}°`;
}

/** Degrees per mm of travel, or per inch of it. */
export function formatAngleGradient(degPerMm: number | null, unit: LengthUnit, sign?: SignStyle): string {
  const perUnit = degPerMm === null ? null : unit === "inch" ? degPerMm * MM_PER_INCH : degPerMm;
  const figure = formatNumber(perUnit, { decimals: unit === "inch" ? 3 : 4, sign });
  return figure === NO_VALUE ? figure : `${figure} °/${unitSymbol(unit)}`;
}

export function formatPercent(percent: number | null, decimals = 0): string {
  const figure = formatNumber(percent, { decimals });
  return figure === NO_VALUE ? figure : `${figure} %`;
}

export function formatCount(count: number, singular: string, plural = `${singular}s`): string {
  return `${count} ${count === 1 ? singular : plural}`;
}

export function formatBytes(bytes: number): string {
  if (bytes < 1000) return `${bytes} bytes`;
  if (bytes < 1_000_000) return `${(bytes / 1000).toFixed(1)} kB`;
  return `${(bytes / 1_000_000).toFixed(1)} MB`;
}

// Dates. The zone is the reader's own unless one is given.

interface DateStyle {
  readonly locale?: string;
  readonly timeZone?: string;
}

export function formatDate(iso: string, { locale = "en-GB", timeZone }: DateStyle = {}): string {
  return new Intl.DateTimeFormat(locale, {
    day: "numeric",
    month: "short",
    year: "numeric",
    timeZone,
  }).format(new Date(iso));
}

export function formatDateTime(iso: string, { locale = "en-GB", timeZone }: DateStyle = {}): string {
  const time = new Intl.DateTimeFormat(locale, { hour: "2-digit", minute: "2-digit", timeZone }).format(
    new Date(iso),
  );
  return `${formatDate(iso, { locale, timeZone } as DateStyle)}, ${time}`;
}

export function formatTimeOfDay(iso: string, { locale = "en-GB", timeZone }: DateStyle = {}): string {
  return new Intl.DateTimeFormat(locale, { hour: "2-digit", minute: "2-digit", timeZone }).format(
    new Date(iso),
  );
}
