// The drawn layers of a travel plot, from the ground up. All but the cursor are still while the cursor moves.

import type { ScaleLinear } from "d3-scale";
import { line } from "d3-shape";
import { memo } from "react";
import { type ColorName, color, font } from "../theme/tokens.ts";
import { type Stage, useCursor } from "./RuleStage.tsx";
import { SvgText } from "./SvgText.tsx";
import {
  findValueAt,
  type SeriesLook,
  type TargetBand,
  type TravelPoint,
  type TravelSeries,
} from "./series.ts";

interface Stroke {
  readonly tone: ColorName;
  readonly width: number;
  readonly dash: string | undefined;
}

export const STROKES: Record<SeriesLook, Stroke> = {
  left: { tone: "dye", width: 2.5, dash: undefined },
  right: { tone: "oxide", width: 2.5, dash: "8 5" },
  faint: { tone: "inkSoft", width: 1.4, dash: "2 4" },
  plain: { tone: "ink", width: 2, dash: undefined },
};

export type ValueScale = ScaleLinear<number, number>;

interface LayerProps {
  readonly stage: Stage;
  readonly scale: ValueScale;
  readonly width: number;
}

const PIXELS_PER_TICK = 68;
/** Room that a tick's figure needs on either side of its line. */
const TICK_ROOM = 16;

interface AxisProps extends LayerProps {
  readonly formatTick: (value: number) => string;
}

export const Axis = memo(function Axis({ stage, scale, width, formatTick }: AxisProps) {
  const ticks = scale.ticks(Math.max(2, Math.round(width / PIXELS_PER_TICK)));
  return (
    <g>
      <line x1="0" x2={width} y1={stage.yOf(0)} y2={stage.yOf(0)} stroke={color.edge} strokeWidth="1" />
      {ticks.map((tick) => {
        const x = scale(tick);
        const isZero = tick === 0;
        return (
          <g key={tick}>
            <line
              x1={x}
              x2={x}
              y1={stage.top}
              y2={stage.bottom}
              stroke={isZero ? color.edge : color.rule}
              strokeWidth="1"
            />
            {x < TICK_ROOM || x > width - TICK_ROOM ? null : (
              <SvgText x={x} y={stage.bottom + 18} anchor="middle" tone="inkSoft">
                {formatTick(tick)}
              </SvgText>
            )}
          </g>
        );
      })}
    </g>
  );
});

export const Band = memo(function Band({ stage, scale, width, band }: LayerProps & { band: TargetBand }) {
  const left = band.min === null ? 0 : scale(band.min);
  const right = band.max === null ? width : scale(band.max);
  const top = stage.yOf(Math.min(stage.to, band.toTravel ?? stage.to));
  const bottom = stage.yOf(Math.max(stage.from, band.fromTravel ?? stage.from));
  return (
    <g>
      <rect
        x={left}
        y={top}
        width={Math.max(0, right - left)}
        height={Math.max(0, bottom - top)}
        fill={color.chromate}
        fillOpacity="0.15"
      />
      {[band.min === null ? null : left, band.max === null ? null : right].map((x) =>
        x === null ? null : (
          <line
            key={x}
            x1={x}
            x2={x}
            y1={top}
            y2={bottom}
            stroke={color.chromate}
            strokeWidth="1"
            strokeDasharray="1 2"
          />
        ),
      )}
    </g>
  );
});

interface CurvesProps extends LayerProps {
  readonly series: readonly TravelSeries[];
}

export const Curves = memo(function Curves({ stage, scale, width, series }: CurvesProps) {
  const path = line<TravelPoint>()
    .defined(({ value }) => value !== null)
    .x(({ value }) => scale(value ?? 0))
    .y(({ travel }) => stage.yOf(travel));
  // Faint ones first, so that the present lies over the past.
  const ordered = [...series].sort((a, b) => Number(b.look === "faint") - Number(a.look === "faint"));
  return (
    <g>
      {ordered.map(({ id, look, points }) => (
        <path
          key={id}
          d={path([...points]) ?? ""}
          fill="none"
          stroke={color[STROKES[look].tone]}
          strokeWidth={STROKES[look].width}
          strokeDasharray={STROKES[look].dash}
          strokeLinejoin="round"
        />
      ))}
      {ordered.map((curve, index) => (
        <CurveName key={curve.id} stage={stage} scale={scale} width={width} curve={curve} place={index} />
      ))}
    </g>
  );
});

/** Names stand one below the other along the upper part of their curves, so that they do not cover each other. */
function CurveName({
  stage,
  scale,
  width,
  curve,
  place,
}: LayerProps & { curve: TravelSeries; place: number }) {
  const travel = stage.to - (stage.to - stage.from) * (0.06 + 0.065 * place);
  const value = findValueAt(curve.points, travel);
  if (value === null) return null;
  const x = scale(value);
  const isPastMiddle = x > width * 0.6;
  return (
    <SvgText
      x={x + (isPastMiddle ? -8 : 8)}
      y={stage.yOf(travel) + 4}
      anchor={isPastMiddle ? "end" : "start"}
      size={13}
      weight={600}
      tone={STROKES[curve.look].tone}
      family={font.head}
      halo="ground"
    >
      {curve.label}
    </SvgText>
  );
}

/** The line that crosses every panel at the rule's flag, with a punch mark on each curve. */
export function Cursor({ stage, scale, width, series }: CurvesProps) {
  const travel = useCursor();
  const y = stage.yOf(travel);
  return (
    <g>
      <line x1="0" x2={width} y1={y} y2={y} stroke={color.dye} strokeWidth="1.25" />
      {series.map(({ id, look, points }) => {
        const value = look === "faint" ? null : findValueAt(points, travel);
        if (value === null) return null;
        return (
          <g key={id} transform={`translate(${scale(value)} ${y})`}>
            <circle r="5" fill={color.panel} stroke={color[STROKES[look].tone]} strokeWidth="1.75" />
            <circle r="1.6" fill={color[STROKES[look].tone]} />
          </g>
        );
      })}
    </g>
  );
}
