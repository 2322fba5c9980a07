import { describe, expect, test } from "vitest";
import page from "../../../public/index.html?raw";
import { type ColorName, type Scheme, schemes } from "./tokens.ts";

function channel(value: number): number {
  const share = value / 255;
  return share <= 0.04045 ? share / 12.92 : ((share + 0.055) / 1.055) ** 2.4;
}

/** Relative luminance after WCAG 2.2. */
function luminance(hex: string): number {
  const [red, green, blue] = [1, 3, 5].map((at) => channel(Number.parseInt(hex.slice(at, at + 2), 16)));
  return 0.2126 * (red ?? 0) + 0.7152 * (green ?? 0) + 0.0722 * (blue ?? 0);
}

function contrast(a: string, b: string): number {
  const [darker, lighter] = [luminance(a), luminance(b)].sort((x, y) => x - y);
  return ((lighter ?? 0) + 0.05) / ((darker ?? 0) + 0.05);
}

/** WCAG 2.2 AA: text, and what only has to be made out, such as a control's frame. */
const TEXT = 4.5;
const FRAME = 3;

const TEXT_TONES: ColorName[] = ["ink", "inkSoft", "dye", "oxide", "chromate", "amber", "fault"];
const GROUNDS: ColorName[] = ["ground", "panel"];

const TEXT_PAIRS: (readonly [ColorName, ColorName])[] = [
  ...TEXT_TONES.flatMap((tone) => GROUNDS.map((ground) => [tone, ground] as const)),
  ["onDye", "dye"],
  ["onDye", "dyeHover"],
  ["onFault", "fault"],
  ["ink", "steel"],
  ["ink", "hover"],
  ["inkSoft", "hover"],
  ["dye", "hover"],
  ["dye", "dyeWash"],
  ["ink", "dyeWash"],
  ["ink", "amberWash"],
  ["amber", "amberWash"],
  ["ink", "faultWash"],
  ["inkSoft", "faultWash"],
  ["fault", "faultWash"],
  ["ink", "chromateWash"],
  ["chromate", "chromateWash"],
];

describe.each(Object.keys(schemes) as Scheme[])("the %s theme", (scheme) => {
  const palette = schemes[scheme];

  test.each(TEXT_PAIRS)("text in %s can be read on %s", (tone, ground) => {
    expect(contrast(palette[tone], palette[ground])).toBeGreaterThanOrEqual(TEXT);
  });

  test.each(GROUNDS)("the frame of a control can be made out on %s", (ground) => {
    expect(contrast(palette.edge, palette[ground])).toBeGreaterThanOrEqual(FRAME);
  });

  test("the first paint has the ground that the app has", () => {
    expect(page).toContain(`background: ${palette.ground}`);
  });
});
