// Text that a person typed → a number, with a message in words when it is none.

export type ParsedNumber =
  | { readonly status: "number"; readonly value: number }
  | { readonly status: "rejected"; readonly message: string };

const DECIMAL = /^[+-]?(\d+[.,]?\d*|[.,]\d+)$/;
/** `3/8`, `1 3/8`, `-1 3/8`: how inches are read off a tape. */
const FRACTION = /^([+-]?)(?:(\d+)\s+)?(\d+)\/(\d+)$/;
const UNIT_SUFFIX = /\s*(mm|in|inch|inches|deg|°|"|″)$/i;
/** Every dash that a keyboard or a paste may bring instead of a minus. */
const MINUS_LIKE = /[‐-―−]/g;

interface Limits {
  readonly min?: number | undefined;
  readonly max?: number | undefined;
  /** For the message about limits: the unit they are told in. */
  readonly unit?: string | undefined;
}

function rejected(message: string): ParsedNumber {
  return { status: "rejected", message };
}

function readFraction(text: string): number | null {
  const parts = FRACTION.exec(text);
  if (!parts) return null;
  const [, sign, whole, numerator, denominator] = parts;
  const size = Number(whole ?? 0) + Number(numerator) / Number(denominator);
  return sign === "-" ? -size : size;
}

/** Reads a decimal with comma or point, or a fraction; a unit behind the number is let pass. */
export function parseNumber(typed: string, limits: Limits = {}): ParsedNumber {
  const text = typed
    .trim()
    .replace(MINUS_LIKE, "-")
    .replace(UNIT_SUFFIX, "")
    .replace(/^([+-])\s+/, "$1");
  if (text === "" || text === "-" || text === "+") return rejected("Type a number.");
  if ((text.match(/[.,]/g) ?? []).length > 1) {
    return rejected("Use one decimal mark and no marks between thousands: 1234.5");
  }
  const value = DECIMAL.test(text) ? Number(text.replace(",", ".")) : readFraction(text);
  if (value === null || !Number.isFinite(value))
    return rejected(`“${typed.trim()}” is not a number. Write it like -12.5`);
  return checkLimits(value, limits);
}

function checkLimits(value: number, { min, max, unit }: Limits): ParsedNumber {
  const suffix = unit ? ` ${unit}` : "";
  if (min !== undefined && value < min) return rejected(`The least is ${min}${suffix}.`);
  if (max !== undefined && value > max) return rejected(`The most is ${max}${suffix}.`);
  // −0 would be shown with a sign.
  return { status: "number", value: value === 0 ? 0 : value };
}
