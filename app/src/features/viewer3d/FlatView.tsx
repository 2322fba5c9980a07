// The same picture drawn flat: what is seen while the graphics library loads, and where there is no WebGL.

import { memo, useSyncExternalStore } from "react";
import { dyedSteel, font } from "../../ui/theme/tokens.ts";
import type { Channel } from "./channel.ts";
import { type FlatDrawing, flatDrawing } from "./flatDrawing.ts";
import { LABEL, MARK } from "./markLook.ts";
import type { SceneModel } from "./sceneModel.ts";
import type { Viewpoint, Viewport } from "./viewpoint.ts";

interface FlatViewProps {
  readonly model: SceneModel;
  readonly viewpoint: Channel<Viewpoint>;
  readonly viewport: Viewport;
  readonly chosen: string | null;
}

export const FlatView = memo(function FlatView({ model, viewpoint, viewport, chosen }: FlatViewProps) {
  const from = useSyncExternalStore(viewpoint.subscribe, viewpoint.get);
  const { strokes, marks, labels } = flatDrawing(model, from, viewport);
  return (
    <svg
      aria-hidden="true"
      width={viewport.width}
      height={viewport.height}
      style={{ position: "absolute", inset: 0, display: "block" }}
    >
      {strokes.map((stroke) => (
        <path
          key={stroke.key}
          d={stroke.d}
          fill="none"
          stroke={stroke.paint}
          strokeWidth={stroke.width}
          strokeOpacity={stroke.opacity}
          strokeDasharray={stroke.dash}
          strokeLinecap="butt"
          strokeLinejoin="round"
        />
      ))}
      {marks.map((mark) => (
        <PunchedPoint key={mark.path} mark={mark} isChosen={mark.path === chosen} />
      ))}
      {labels.map(({ text, x, y, paint }) => (
        <text
          key={text}
          x={x}
          y={y + LABEL.belowPx}
          fill={paint}
          stroke={dyedSteel.ground}
          strokeWidth={4}
          paintOrder="stroke"
          textAnchor="middle"
          dominantBaseline="central"
          fontFamily={font.head}
          fontWeight={600}
          fontSize={LABEL.sizePx}
        >
          {text}
        </text>
      ))}
    </svg>
  );
});

interface PunchedPointProps {
  readonly mark: FlatDrawing["marks"][number];
  readonly isChosen: boolean;
}

function PunchedPoint({ mark: { x, y, name }, isChosen }: PunchedPointProps) {
  const [paper, line] = isChosen ? [dyedSteel.ink, dyedSteel.ground] : [dyedSteel.ground, dyedSteel.ink];
  const radius = MARK.ringRadius - MARK.ringWidth / 2;
  return (
    <g transform={`translate(${x} ${y})`}>
      {isChosen ? (
        <circle r={MARK.chosenDiameter / 2 - 1.75} fill="none" stroke={dyedSteel.ink} strokeWidth={1.5} />
      ) : null}
      <circle r={radius} fill={paper} stroke={line} strokeWidth={MARK.ringWidth} />
      <circle r={MARK.dotRadius} fill={line} />
      {isChosen ? (
        <text
          y={-MARK.chosenDiameter / 2 - 10}
          fill={dyedSteel.ink}
          stroke={dyedSteel.ground}
          strokeWidth={4}
          paintOrder="stroke"
          textAnchor="middle"
          fontFamily={font.text}
          fontWeight={600}
          fontSize={LABEL.sizePx}
        >
          {name}
        </text>
      ) : null}
    </g>
  );
}
