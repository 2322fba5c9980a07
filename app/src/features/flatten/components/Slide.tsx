import { useEffect, useRef, useState } from "react";
import { StyleSheet } from "react-native";
import { DomInput } from "@/ui/dom.tsx";
import { color } from "@/ui/theme/tokens.ts";

interface SlideProps {
  readonly label: string;
  /** mm, as are the ends. */
  readonly value: number;
  readonly from: number;
  readonly to: number;
  readonly valueText: string;
  readonly onSlide: (mm: number) => void;
}

/** mm: what the slide is read to. */
const GRAIN = 0.1;

/** A value slid between two ends. The thumb follows the pointer; what hangs on it is told once a frame. */
export function Slide({ label, value, from, to, valueText, onSlide }: SlideProps) {
  const [thumb, setThumb] = useState<number | null>(null);
  const frame = useRef<number | null>(null);
  const latest = useRef({ onSlide, mm: value });
  latest.current.onSlide = onSlide;
  useEffect(
    () => () => {
      if (frame.current !== null) cancelAnimationFrame(frame.current);
    },
    [],
  );
  const slideTo = (mm: number) => {
    setThumb(mm);
    latest.current.mm = mm;
    frame.current ??= requestAnimationFrame(() => {
      frame.current = null;
      setThumb(null);
      latest.current.onSlide(latest.current.mm);
    });
  };
  return (
    <DomInput
      type="range"
      aria-label={label}
      aria-valuetext={valueText}
      min={from}
      max={to}
      step={GRAIN}
      value={thumb ?? value}
      onChange={(event) => slideTo(Number(event.currentTarget.value))}
      style={styles.slide}
    />
  );
}

const styles = StyleSheet.create({
  slide: { width: "100%", height: 32, margin: 0, accentColor: color.dye, cursor: "ew-resize" } as object,
});
