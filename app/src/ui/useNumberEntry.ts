import { useState } from "react";
import { formatNumber, type SignStyle } from "@/lib/format.ts";
import { parseNumber } from "@/lib/parseNumber.ts";

export interface NumberEntryOptions {
  readonly value: number | null;
  readonly decimals: number;
  readonly step: number;
  readonly sign?: SignStyle | undefined;
  readonly unit?: string | undefined;
  readonly min?: number | undefined;
  readonly max?: number | undefined;
  readonly onCommit: (value: number) => void;
}

/** Keeps sums of decimal steps from growing tails like 0.30000000000000004. */
function withoutTail(value: number): number {
  return Number(value.toPrecision(12));
}

/**
 * What is typed stays as typed until it is committed (Enter, leaving the field, or a step); rubbish stays too, with a
 * message. A field left as it was commits nothing, so that showing a value rounded never changes it.
 */
export function useNumberEntry(options: NumberEntryOptions) {
  const { value, decimals, step, sign, unit, min, max, onCommit } = options;
  const [draft, setDraft] = useState<string | null>(null);
  const [message, setMessage] = useState<string>();
  const shown = value === null ? "" : formatNumber(value, { decimals, sign });

  const settle = () => {
    setDraft(null);
    setMessage(undefined);
  };

  const type = (text: string) => {
    setDraft(text);
    if (message && parseNumber(text, { min, max, unit }).status === "number") setMessage(undefined);
  };

  const commit = () => {
    if (draft === null) return;
    if (draft.trim() === shown) return settle();
    const parsed = parseNumber(draft, { min, max, unit });
    if (parsed.status === "rejected") return setMessage(parsed.message);
    settle();
    onCommit(parsed.value);
  };

  const commitValue = (next: number) => {
    const clamped = Math.min(max ?? Infinity, Math.max(min ?? -Infinity, withoutTail(next)));
    settle();
    if (clamped !== value) onCommit(clamped);
  };

  const current = () => {
    const parsed = draft === null ? null : parseNumber(draft);
    return parsed?.status === "number" ? parsed.value : (value ?? 0);
  };

  return {
    text: draft ?? shown,
    message,
    type,
    commit,
    revert: settle,
    stepBy: (count: number) => commitValue(current() + count * step),
    flipSign: () => commitValue(-current()),
  };
}
