// Numbers as they are written on the command line.

import { InvalidArgumentError } from "commander";

/** More points than this are a slip of a digit, not a sweep. */
const MOST_POINTS = 200_000;

/** `FROM:TO:STEP`, ends included; FROM may equal TO, and may lie above it. */
export function parseRange(text: string): number[] {
  const parts = text.split(":").map(parseNumber);
  const [from, to, step] = parts;
  if (parts.length !== 3 || from === undefined || to === undefined || step === undefined) {
    throw new InvalidArgumentError("Write FROM:TO:STEP, for example -60:60:5.");
  }
  if (from === to) return [from];
  if (!(step > 0)) throw new InvalidArgumentError("STEP must be greater than 0.");
  const steps = Math.abs(to - from) / step;
  if (steps > MOST_POINTS) throw new InvalidArgumentError(`That is more than ${MOST_POINTS} points.`);
  const way = Math.sign(to - from);
  // Counted from FROM by multiplication, so that no error builds up; a hair short of TO is TO.
  const whole = Math.floor(steps + 1e-9);
  const values = Array.from({ length: whole + 1 }, (_, k) => from + way * k * step);
  if (Math.abs(steps - whole) < 1e-9) values[whole] = to;
  return values;
}

/** Numbers parted by commas. */
export function parseList(text: string): number[] {
  return text.split(",").map(parseNumber);
}

export function parseNumber(text: string): number {
  const value = Number(text);
  if (text.trim() === "" || !Number.isFinite(value)) {
    throw new InvalidArgumentError(`"${text}" is not a number.`);
  }
  return value;
}
