// Fonts shipped with the app. Declared by hand rather than through expo-font, for weights, swap and unicode ranges:
// the Latin Extended files are then fetched only when a name needs them.

import barlow400 from "@fontsource/barlow/files/barlow-latin-400-normal.woff2";
import barlow600 from "@fontsource/barlow/files/barlow-latin-600-normal.woff2";
import barlowExt400 from "@fontsource/barlow/files/barlow-latin-ext-400-normal.woff2";
import barlowExt600 from "@fontsource/barlow/files/barlow-latin-ext-600-normal.woff2";
import condensed500 from "@fontsource/barlow-semi-condensed/files/barlow-semi-condensed-latin-500-normal.woff2";
import condensed600 from "@fontsource/barlow-semi-condensed/files/barlow-semi-condensed-latin-600-normal.woff2";
import condensedExt600 from "@fontsource/barlow-semi-condensed/files/barlow-semi-condensed-latin-ext-600-normal.woff2";
import mono400 from "@fontsource/ibm-plex-mono/files/ibm-plex-mono-latin-400-normal.woff2";
import mono500 from "@fontsource/ibm-plex-mono/files/ibm-plex-mono-latin-500-normal.woff2";

const LATIN =
  "U+0000-00FF,U+0131,U+0152-0153,U+02BB-02BC,U+02C6,U+02DA,U+02DC,U+2000-206F,U+20AC,U+2122,U+2191,U+2193,U+2212,U+2215,U+FEFF,U+FFFD";
const LATIN_EXTENDED =
  "U+0100-02BA,U+02BD-02C5,U+02C7-02CC,U+02CE-02D7,U+02DD-02FF,U+1D00-1DBF,U+1E00-1E9F,U+1EF2-1EFF,U+2020,U+20A0-20AB,U+20AD-20C0,U+2113,U+2C60-2C7F,U+A720-A7FF";

const FACES = [
  ["Barlow", 400, barlow400, LATIN],
  ["Barlow", 600, barlow600, LATIN],
  ["Barlow", 400, barlowExt400, LATIN_EXTENDED],
  ["Barlow", 600, barlowExt600, LATIN_EXTENDED],
  ["Barlow Semi Condensed", 500, condensed500, LATIN],
  ["Barlow Semi Condensed", 600, condensed600, LATIN],
  ["Barlow Semi Condensed", 600, condensedExt600, LATIN_EXTENDED],
  ["IBM Plex Mono", 400, mono400, LATIN],
  ["IBM Plex Mono", 500, mono500, LATIN],
] as const;

export function fontFaceRules(): string {
  return FACES.map(
    ([family, weight, file, range]) =>
      `@font-face{font-family:"${family}";font-weight:${weight};font-display:swap;src:url("${file}") format("woff2");unicode-range:${range}}`,
  ).join("\n");
}

/** Long enough for a cached or local load, short enough not to hold the page back on a bad line. */
const FONT_PATIENCE_MS = 700;

/** Resolves when the faces of the first screen are in, or patience has run out; never rejects. */
export async function awaitFonts(): Promise<void> {
  const faces = [
    "400 16px Barlow",
    "600 16px Barlow",
    '500 16px "Barlow Semi Condensed"',
    '600 16px "Barlow Semi Condensed"',
    '400 16px "IBM Plex Mono"',
  ];
  const loaded = Promise.allSettled(faces.map((face) => document.fonts.load(face)));
  const patience = new Promise((resolve) => setTimeout(resolve, FONT_PATIENCE_MS));
  await Promise.race([loaded, patience]);
}
