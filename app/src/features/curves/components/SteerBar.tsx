import { memo } from "react";
import { SvgText } from "@/ui/rule/SvgText.tsx";
import { color, font } from "@/ui/theme/tokens.ts";

interface SteerBarProps {
  readonly width: number;
  /** Along the bar: −lock at its left end, +lock at its right. */
  readonly at: number;
  readonly lock: number;
}

const HEIGHT = 44;
const BAR_TOP = 8;
const BAR_HEIGHT = 18;
/** Half the pointer, so that it stays whole at either end. */
const MARGIN = 8;
const PARTS = 10;

/** A steel bar with a mark at centre and the locks at its ends, and the pointer that stands on it. */
export function SteerBar({ width, at, lock }: SteerBarProps) {
  const x = MARGIN + ((at / lock + 1) / 2) * (width - 2 * MARGIN);
  return (
    <svg width={width} height={HEIGHT} aria-hidden="true" style={{ display: "block" }}>
      <Bar width={width} />
      <path
        d={`M${x} ${BAR_TOP + 4} l7 ${-8} h${-14} Z M${x} ${BAR_TOP} v${BAR_HEIGHT}`}
        fill={color.dye}
        stroke={color.dye}
        strokeWidth="2"
      />
    </svg>
  );
}

const Bar = memo(function Bar({ width }: { width: number }) {
  const length = width - 2 * MARGIN;
  const base = BAR_TOP + BAR_HEIGHT;
  return (
    <g>
      <rect
        x={MARGIN}
        y={BAR_TOP + 0.5}
        width={length}
        height={BAR_HEIGHT - 1}
        fill={color.steel}
        stroke={color.edge}
        strokeOpacity="0.55"
      />
      {Array.from({ length: PARTS + 1 }, (_, part) => {
        const x = MARGIN + (length * part) / PARTS;
        const mark = part === PARTS / 2 ? BAR_HEIGHT : part % PARTS === 0 ? 13 : 6;
        return <line key={x} x1={x} x2={x} y1={base - mark} y2={base} stroke={color.ink} strokeWidth="1" />;
      })}
      <SvgText x={MARGIN} y={HEIGHT - 4} size={13} tone="inkSoft" family={font.head}>
        left lock
      </SvgText>
      <SvgText x={width / 2} y={HEIGHT - 4} size={13} tone="inkSoft" family={font.head} anchor="middle">
        straight
      </SvgText>
      <SvgText x={width - MARGIN} y={HEIGHT - 4} size={13} tone="inkSoft" family={font.head} anchor="end">
        right lock
      </SvgText>
    </g>
  );
});
