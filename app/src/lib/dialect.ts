// The trade's words on either side of the Atlantic. Screens take their words from here and never spell them out.

import type { Preferences } from "@linkwright/contract";

export type Dialect = Preferences["dialect"];

const UK = {
  dropArm: "drop arm",
  tieRod: "track rod",
  caster: "castor",
  antiRollBar: "anti-roll bar",
  wishbone: "wishbone",
  upright: "upright",
  dialGauge: "dial gauge",
  rodEnd: "rose joint",
  tyre: "tyre",
  splitPin: "split pin",
} as const;

export type DialectWord = keyof typeof UK;

const US: Readonly<Record<DialectWord, string>> = {
  dropArm: "Pitman arm",
  tieRod: "tie rod",
  caster: "caster",
  antiRollBar: "sway bar",
  wishbone: "A-arm",
  upright: "spindle",
  dialGauge: "dial indicator",
  rodEnd: "rod end",
  tyre: "tire",
  splitPin: "cotter pin",
};

export const DIALECT_WORDS: Readonly<Record<Dialect, Readonly<Record<DialectWord, string>>>> = {
  uk: UK,
  us: US,
};

export function capitalise(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

export function localeOf(dialect: Dialect): string {
  return dialect === "us" ? "en-US" : "en-GB";
}
