import { type KeyboardEvent, memo } from "react";
import { StyleSheet } from "react-native";
import { formatTravel, mmFromLength, unitSymbol } from "@/lib/format.ts";
import { DomDiv } from "../dom.tsx";
import { Text } from "../Text.tsx";
import { color, font, space } from "../theme/tokens.ts";
import { dragHandlers, rulerGrain } from "./drag.ts";
import { findGraduations, type Graduation } from "./graduations.ts";
import { HEAD_HEIGHT, type Stage, useCursor, useStage } from "./RuleStage.tsx";
import { SvgText } from "./SvgText.tsx";

const BODY_WIDTH = 48;
const FLAG_WIDTH = 46;
export const RULE_WIDTH = BODY_WIDTH + FLAG_WIDTH + 2;
const FLAG_HEIGHT = 22;
const MARK_LENGTH: Record<Graduation["size"], number> = { labelled: 15, half: 11, fine: 6 };

interface SteelRuleProps {
  /** What is moved; wheel travel unless said otherwise. */
  readonly label?: string;
}

/** The graduated rule with its flag: drag it, or use the arrow keys, Page Up and Down, Home and End. */
export function SteelRule({ label = "Wheel travel" }: SteelRuleProps) {
  const stage = useStage();
  const travel = useCursor();
  const symbol = unitSymbol(stage.unit);
  const valueText = `${formatTravel(travel, stage.unit)} ${symbol}, ${travel > 0 ? "bump" : travel < 0 ? "droop" : "design"}`;
  return (
    <DomDiv style={styles.column}>
      <DomDiv style={styles.head}>
        <Text variant="label" tone="inkSoft">
          Travel
        </Text>
        <Text variant="label" tone="inkSoft">
          {symbol}
        </Text>
      </DomDiv>
      <DomDiv
        role="slider"
        tabIndex={0}
        aria-label={label}
        aria-orientation="vertical"
        aria-valuemin={stage.from}
        aria-valuemax={stage.to}
        aria-valuenow={travel}
        aria-valuetext={valueText}
        onKeyDown={(event) => handleKey(event, stage, travel)}
        {...dragHandlers(stage)}
        style={styles.slider as object}
      >
        <svg
          width={RULE_WIDTH}
          height={stage.height}
          aria-hidden="true"
          style={{ display: "block", overflow: "visible" }}
        >
          <RuleBody stage={stage} />
          <Flag y={stage.yOf(travel)} text={formatTravel(travel, stage.unit)} />
        </svg>
      </DomDiv>
    </DomDiv>
  );
}

function handleKey(event: KeyboardEvent, stage: Stage, travel: number) {
  const fine = rulerGrain(stage);
  const coarse = stage.unit === "inch" ? mmFromLength(0.5, "inch") : 10;
  const stride = event.shiftKey ? coarse : fine;
  const targets: Record<string, number> = {
    ArrowUp: travel + stride,
    ArrowRight: travel + stride,
    ArrowDown: travel - stride,
    ArrowLeft: travel - stride,
    PageUp: travel + coarse,
    PageDown: travel - coarse,
    Home: stage.from,
    End: stage.to,
  };
  const target = targets[event.key];
  if (target === undefined) return;
  event.preventDefault();
  stage.moveTo(target);
}

const RuleBody = memo(function RuleBody({ stage }: { stage: Stage }) {
  const pixelsPerMm = (stage.bottom - stage.top) / (stage.to - stage.from);
  const marks = findGraduations(stage.from, stage.to, stage.unit, pixelsPerMm);
  return (
    <g>
      <rect
        x="0.5"
        y={stage.top}
        width={BODY_WIDTH}
        height={stage.bottom - stage.top}
        fill={color.steel}
        stroke={color.edge}
        strokeOpacity="0.55"
      />
      {marks.map(({ travel, size, label }) => {
        const y = stage.yOf(travel);
        return (
          <g key={travel}>
            <line
              x1={BODY_WIDTH - MARK_LENGTH[size]}
              x2={BODY_WIDTH}
              y1={y}
              y2={y}
              stroke={color.ink}
              strokeWidth={size === "fine" ? 0.8 : 1.1}
            />
            {label === null || isNearEnd(y, stage) ? null : (
              <SvgText x={BODY_WIDTH - 18} y={y + 4} anchor="end" size={12}>
                {label}
              </SvgText>
            )}
          </g>
        );
      })}
      <SvgText x={1} y={stage.bottom + 18} size={13} tone="inkSoft" family={font.head}>
        droop
      </SvgText>
    </g>
  );
});

/** A label cut in half by the rule's end is worse than none. */
function isNearEnd(y: number, stage: Stage): boolean {
  return y - stage.top < 5 || stage.bottom - y < 5;
}

function Flag({ y, text }: { y: number; text: string }) {
  const half = FLAG_HEIGHT / 2;
  const left = BODY_WIDTH + 2;
  const right = left + FLAG_WIDTH;
  return (
    <g transform={`translate(0 ${y})`} style={{ cursor: "grab" }}>
      <path d={`M${left} 0 L${left + 9} ${-half} H${right} V${half} H${left + 9} Z`} fill={color.dye} />
      <SvgText x={left + 9 + (FLAG_WIDTH - 9) / 2} y={4.5} anchor="middle" size={13} tone="onDye">
        {text}
      </SvgText>
    </g>
  );
}

const styles = StyleSheet.create({
  column: { width: RULE_WIDTH, flexShrink: 0 },
  head: {
    height: HEAD_HEIGHT,
    width: BODY_WIDTH,
    display: "flex",
    flexDirection: "column",
    boxSizing: "border-box",
    paddingBottom: space.xs,
  } as object,
  slider: { touchAction: "none", cursor: "ns-resize", userSelect: "none" },
});
