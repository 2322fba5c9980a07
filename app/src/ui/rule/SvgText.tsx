import { type ColorName, color, font } from "../theme/tokens.ts";

interface SvgTextProps {
  readonly x: number;
  readonly y: number;
  readonly children: string;
  readonly anchor?: "start" | "middle" | "end";
  readonly size?: number;
  readonly tone?: ColorName;
  readonly family?: string;
  readonly weight?: number;
  /** A rim in the colour of the ground, so that a line behind it does not cross the letters. */
  readonly halo?: ColorName;
}

export function SvgText({
  children,
  anchor = "start",
  size = 12,
  tone = "ink",
  family = font.figure,
  weight,
  halo,
  ...place
}: SvgTextProps) {
  return (
    <text
      {...place}
      textAnchor={anchor}
      fontSize={size}
      fontFamily={family}
      fontWeight={weight}
      fill={color[tone]}
      stroke={halo ? color[halo] : undefined}
      strokeWidth={halo ? 4 : undefined}
      paintOrder="stroke"
      style={{ userSelect: "none", fontVariantNumeric: "tabular-nums" }}
    >
      {children}
    </text>
  );
}
