// Small drawn signs, so that no state is told by colour alone and no glyph is missing from the fonts.

import { type ColorName, color } from "./theme/tokens.ts";

export type SignKind = "ok" | "amber" | "fault" | "info";

const SIGN_TONE: Record<SignKind, ColorName> = {
  ok: "chromate",
  amber: "amber",
  fault: "fault",
  info: "dye",
};

interface SignProps {
  readonly kind: SignKind;
  readonly size?: number;
}

/** Tick, triangle, crossed octagon, ring: told apart by shape. Decorative; the word stands beside it. */
export function Sign({ kind, size = 18 }: SignProps) {
  const stroke = color[SIGN_TONE[kind]];
  return (
    <svg
      aria-hidden="true"
      width={size}
      height={size}
      viewBox="0 0 18 18"
      style={{ flexShrink: 0, marginTop: 1 }}
      fill="none"
      stroke={stroke}
      strokeWidth="1.8"
    >
      {kind === "ok" ? <path d="M3 9.5 7.2 14 15 4.5" strokeWidth="2.2" /> : null}
      {kind === "amber" ? <path d="M9 2.2 16.6 15.6H1.4ZM9 7v4.2M9 12.6v1.3" /> : null}
      {kind === "fault" ? (
        <path d="M5.8 1.5h6.4l4.3 4.3v6.4l-4.3 4.3H5.8l-4.3-4.3V5.8ZM6 6l6 6M12 6l-6 6" />
      ) : null}
      {kind === "info" ? (
        <>
          <circle cx="9" cy="9" r="7.2" />
          <path d="M9 8v5M9 4.8v1.5" />
        </>
      ) : null}
    </svg>
  );
}
