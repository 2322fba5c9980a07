import { type ColorName, color } from "./theme/tokens.ts";

interface PunchMarkProps {
  readonly size?: number;
  readonly tone?: ColorName;
}

/** A dot in a circle, as a centre-punch leaves it: the sign of a hardpoint everywhere. Decorative. */
export function PunchMark({ size = 14, tone = "ink" }: PunchMarkProps) {
  return (
    <svg aria-hidden="true" width={size} height={size} viewBox="0 0 14 14" style={{ flexShrink: 0 }}>
      <circle cx="7" cy="7" r="5.4" fill="none" stroke={color[tone]} strokeWidth="1.5" />
      <circle cx="7" cy="7" r="1.7" fill={color[tone]} />
    </svg>
  );
}
