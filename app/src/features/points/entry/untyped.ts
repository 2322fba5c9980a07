import { parseNumber } from "../../../lib/parseNumber.ts";

/** Whether a field shows its value as it is, rounded as fields round, so that undo means the drawing and not the typing. */
export function isUntyped(text: string, value: number): boolean {
  const parsed = parseNumber(text);
  if (parsed.status !== "number") return false;
  const decimals = /[.,](\d+)/.exec(text)?.[1]?.length ?? 0;
  return Math.abs(parsed.value - value) <= 0.5001 * 10 ** -decimals;
}
