// The look in figures: layout dye, primer, chromate. Components use `color`, which follows the theme by CSS variables;
// only what cannot read a variable (WebGL, tests) reads the palettes themselves.

export const light = {
  ground: "#F4F1EA",
  panel: "#FFFFFF",
  ink: "#17202E",
  rule: "#D5D0C4",
  dye: "#1E3F94",
  oxide: "#A23E26",
  chromate: "#5E7324",
  amber: "#9A5B00",
  fault: "#B00020",
  // Mixtures of the above.
  inkSoft: "#555B63",
  edge: "#82868A",
  onDye: "#FFFFFF",
  onFault: "#FFFFFF",
  dyeHover: "#17327A",
  dyeWash: "#E9EDF7",
  oxideWash: "#F8F1EF",
  chromateWash: "#F3F5ED",
  amberWash: "#F9F4EA",
  faultWash: "#FAEDEF",
  steel: "#E7E2D6",
  hover: "#ECE8DE",
  veil: "#17202E99",
} as const;

export type ColorName = keyof typeof light;
export type Palette = Readonly<Record<ColorName, string>>;

export const dark: Palette = {
  ground: "#0F1830",
  panel: "#182444",
  ink: "#EDF1F8",
  rule: "#33436B",
  dye: "#8FB0FF",
  oxide: "#F0907A",
  chromate: "#B7CC6A",
  amber: "#F2B84B",
  fault: "#FF8A93",
  inkSoft: "#AEB6C6",
  edge: "#77819A",
  onDye: "#0F1830",
  onFault: "#0F1830",
  dyeHover: "#A9C2FF",
  dyeWash: "#22315A",
  oxideWash: "#2E2B47",
  chromateWash: "#273547",
  amberWash: "#2E3345",
  faultWash: "#312D4B",
  steel: "#1B294E",
  hover: "#202E55",
  veil: "#050A18B3",
};

export const schemes = { light, dark } as const;
export type Scheme = keyof typeof schemes;

/** Dyed steel is the same in both themes: pictures of the linkage stand on it. */
export const dyedSteel = dark;

function variablesOf(palette: Palette): Palette {
  const names = Object.keys(palette) as ColorName[];
  return Object.fromEntries(names.map((name) => [name, `var(--${name})`])) as Record<ColorName, string>;
}

export const color = variablesOf(light);

export const space = { hair: 2, xs: 4, s: 8, m: 12, l: 16, xl: 24, xxl: 32, xxxl: 48, huge: 72 } as const;
export const corner = 2;
export const hairline = 1;
/** The least side of anything a thumb must hit. */
export const touch = 44;

export const breakpoint = { medium: 640, wide: 1024 } as const;

export const font = {
  text: "Barlow, system-ui, sans-serif",
  head: "'Barlow Semi Condensed', 'Barlow', system-ui, sans-serif",
  figure: "'IBM Plex Mono', ui-monospace, monospace",
} as const;

const tabular: "tabular-nums"[] = ["tabular-nums"];

export const type = {
  display: { fontFamily: font.head, fontWeight: "600", fontSize: 44, lineHeight: 48, letterSpacing: -0.4 },
  title: { fontFamily: font.head, fontWeight: "600", fontSize: 26, lineHeight: 32, letterSpacing: -0.1 },
  section: { fontFamily: font.head, fontWeight: "600", fontSize: 20, lineHeight: 26 },
  block: { fontFamily: font.head, fontWeight: "600", fontSize: 17, lineHeight: 22 },
  body: { fontFamily: font.text, fontWeight: "400", fontSize: 16, lineHeight: 24 },
  strong: { fontFamily: font.text, fontWeight: "600", fontSize: 16, lineHeight: 24 },
  small: { fontFamily: font.text, fontWeight: "400", fontSize: 14, lineHeight: 20 },
  label: { fontFamily: font.head, fontWeight: "500", fontSize: 14, lineHeight: 18 },
  tableHead: { fontFamily: font.head, fontWeight: "600", fontSize: 14, lineHeight: 18 },
  figure: { fontFamily: font.figure, fontWeight: "400", fontSize: 15, lineHeight: 20, fontVariant: tabular },
  figureSmall: {
    fontFamily: font.figure,
    fontWeight: "400",
    fontSize: 13,
    lineHeight: 18,
    fontVariant: tabular,
  },
  figureLarge: {
    fontFamily: font.figure,
    fontWeight: "500",
    fontSize: 24,
    lineHeight: 30,
    fontVariant: tabular,
  },
} as const;
export type TypeName = keyof typeof type;
