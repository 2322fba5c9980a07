import { scaleLinear } from "d3-scale";
import { useMemo } from "react";
import { StyleSheet } from "react-native";
import { DomDiv } from "../dom.tsx";
import { Text } from "../Text.tsx";
import { color, space } from "../theme/tokens.ts";
import { useSize } from "../useSize.ts";
import { dragHandlers } from "./drag.ts";
import { Axis, Band, Cursor, Curves, STROKES } from "./plotLayers.tsx";
import { HEAD_HEIGHT, useCursor, useStage } from "./RuleStage.tsx";
import { findValueAt, type TargetBand, type TravelSeries, valueDomain } from "./series.ts";

interface TravelPlotProps {
  readonly title: string;
  /** Of the value axis, e.g. "degrees". */
  readonly unitLabel: string;
  readonly series: readonly TravelSeries[];
  readonly band?: TargetBand | undefined;
  readonly minSpan: number;
  readonly include?: number;
  /** A value as the read-out shows it. */
  readonly format: (value: number | null) => string;
  readonly formatTick: (value: number) => string;
  /** Share of the width when several panels stand side by side. */
  readonly grow?: number;
  readonly minWidth?: number;
}

/** One quantity over wheel travel, standing beside the rule on the same axis. */
export function TravelPlot({
  title,
  unitLabel,
  series,
  band,
  minSpan,
  include,
  format,
  formatTick,
  grow = 1,
  minWidth = 96,
}: TravelPlotProps) {
  const stage = useStage();
  const [ref, { width }] = useSize<HTMLDivElement>();
  const scale = useMemo(
    () =>
      scaleLinear()
        .domain(valueDomain({ series, band, minSpan, include }))
        .range([6, Math.max(7, width - 6)]),
    [series, band, minSpan, include, width],
  );
  return (
    <DomDiv style={[styles.column, { flexGrow: grow, minWidth }]}>
      <DomDiv style={styles.head as object}>
        <DomDiv style={styles.titles as object}>
          <Text variant="tableHead" numberOfLines={1}>
            {title}
          </Text>
          <Text variant="label" tone="inkSoft" numberOfLines={1}>
            {unitLabel}
          </Text>
        </DomDiv>
        <ReadOut series={series} format={format} />
      </DomDiv>
      <DomDiv ref={ref} {...dragHandlers(stage)} style={styles.drawing as object}>
        {width > 0 ? (
          <svg
            width={width}
            height={stage.height}
            role="img"
            aria-label={`${title} over wheel travel, ${unitLabel}`}
            style={{ display: "block" }}
          >
            <Axis stage={stage} scale={scale} width={width} formatTick={formatTick} />
            {band ? <Band stage={stage} scale={scale} band={band} width={width} /> : null}
            <Curves stage={stage} scale={scale} series={series} width={width} />
            <Cursor stage={stage} scale={scale} series={series} width={width} />
          </svg>
        ) : null}
      </DomDiv>
    </DomDiv>
  );
}

/** The values where the cursor stands; the line sample tells the sides apart without colour. */
function ReadOut({
  series,
  format,
}: {
  series: readonly TravelSeries[];
  format: (value: number | null) => string;
}) {
  const travel = useCursor();
  return (
    <DomDiv style={styles.readOut as object}>
      {series
        .filter(({ look }) => look !== "faint")
        .map(({ id, label, look, points }) => (
          <DomDiv key={id} style={styles.reading as object} title={label}>
            <svg aria-hidden="true" width="14" height="8">
              <line
                x1="0"
                x2="14"
                y1="4"
                y2="4"
                stroke={color[STROKES[look].tone]}
                strokeWidth="2.5"
                strokeDasharray={look === "right" ? "5 3" : undefined}
              />
            </svg>
            <Text
              variant="figureSmall"
              tone={STROKES[look].tone}
              aria-label={`${label} ${format(findValueAt(points, travel))}`}
            >
              {format(findValueAt(points, travel))}
            </Text>
          </DomDiv>
        ))}
    </DomDiv>
  );
}

const styles = StyleSheet.create({
  column: { flexBasis: 0, flexShrink: 1, display: "flex", flexDirection: "column" },
  head: { height: HEAD_HEIGHT, boxSizing: "border-box", paddingHorizontal: space.xs + 2, overflow: "hidden" },
  titles: { display: "flex", flexDirection: "row", justifyContent: "space-between", gap: space.s },
  readOut: {
    display: "flex",
    flexDirection: "row",
    flexWrap: "wrap",
    columnGap: space.m,
  },
  reading: { display: "flex", flexDirection: "row", alignItems: "center", gap: space.xs },
  drawing: { cursor: "ns-resize", touchAction: "pan-y" },
});
