import type { LengthUnit } from "@linkwright/contract";
import { type Axle, steeringLock } from "@linkwright/kinematics";
import { type KeyboardEvent, type PointerEvent, useMemo } from "react";
import { StyleSheet, View } from "react-native";
import { leftLockSign, steerInWords } from "@/features/safety/index.ts";
import { capitalise } from "@/lib/dialect.ts";
import { Button } from "@/ui/Button.tsx";
import { DomDiv } from "@/ui/dom.tsx";
import { Text } from "@/ui/Text.tsx";
import { space, touch } from "@/ui/theme/tokens.ts";
import { useSize } from "@/ui/useSize.ts";
import { usePose, usePoseStore } from "../pose/PoseProvider.tsx";
import { SteerBar } from "./SteerBar.tsx";

interface SteerHandleProps {
  readonly axle: Axle;
  readonly units: LengthUnit;
}

/** mm or degrees: what the handle is read to, and a coarser stride. */
const FINE = 1;
const COARSE = 10;

/** Turns the steering, left lock on the left. Nothing is drawn where nothing steers. */
export function SteerHandle({ axle, units }: SteerHandleProps) {
  const store = usePoseStore();
  const steer = usePose((pose) => pose.steer);
  const lock = steeringLock(axle.steering);
  const leftSign = useMemo(() => leftLockSign(axle), [axle]);
  if (lock === 0) return null;
  // Along the handle from left to right.
  const at = held(-leftSign * steer, lock);
  const words = steerInWords(axle, -leftSign * at, units);
  const steerAt = (next: number) => ({ steer: -leftSign * held(next, lock) || 0 });
  const moveTo = (next: number) => store.change(steerAt(next));
  return (
    <View style={styles.handle}>
      <View style={styles.head}>
        <Text variant="label" tone="inkSoft">
          Steering
        </Text>
        <Text variant="label">{capitalise(words)}</Text>
        {at === 0 ? null : (
          <Button kind="quiet" label="Straighten" onPress={() => moveTo(0)} style={styles.straighten} />
        )}
      </View>
      <Track
        at={at}
        lock={lock}
        words={words}
        moveTo={moveTo}
        follow={(next) => store.follow(steerAt(next))}
      />
    </View>
  );
}

interface TrackProps {
  readonly at: number;
  readonly lock: number;
  readonly words: string;
  readonly moveTo: (at: number) => void;
  /** A moving pointer, once a frame. */
  readonly follow: (at: number) => void;
}

function Track({ at, lock, words, moveTo, follow }: TrackProps) {
  const [ref, { width }] = useSize<HTMLDivElement>();
  const placeOf = (event: PointerEvent<HTMLElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    const share = ((event.clientX - box.left) / box.width) * 2 - 1;
    return Math.round((share * lock) / FINE) * FINE;
  };
  return (
    <DomDiv
      ref={ref}
      role="slider"
      tabIndex={0}
      aria-label="Steering"
      aria-orientation="horizontal"
      aria-valuemin={-lock}
      aria-valuemax={lock}
      aria-valuenow={at}
      aria-valuetext={words}
      onKeyDown={(event) => handleKey(event, at, lock, moveTo)}
      onPointerDown={(event: PointerEvent<HTMLElement>) => {
        if (event.button !== 0) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        moveTo(placeOf(event));
      }}
      onPointerMove={(event: PointerEvent<HTMLElement>) => {
        if (event.currentTarget.hasPointerCapture(event.pointerId)) follow(placeOf(event));
      }}
      style={styles.track as object}
    >
      {width > 0 ? <SteerBar width={width} at={at} lock={lock} /> : null}
    </DomDiv>
  );
}

function handleKey(event: KeyboardEvent, at: number, lock: number, moveTo: (at: number) => void) {
  const stride = event.shiftKey ? COARSE : FINE;
  const targets: Record<string, number> = {
    ArrowRight: at + stride,
    ArrowUp: at + stride,
    ArrowLeft: at - stride,
    ArrowDown: at - stride,
    PageUp: at + COARSE,
    PageDown: at - COARSE,
    Home: -lock,
    End: lock,
  };
  const target = targets[event.key];
  if (target === undefined) return;
  event.preventDefault();
  moveTo(target);
}

function held(value: number, lock: number): number {
  return Math.min(lock, Math.max(-lock, value)) || 0;
}

const styles = StyleSheet.create({
  handle: { gap: space.xs },
  head: { flexDirection: "row", alignItems: "center", gap: space.m, minHeight: 28 },
  straighten: { minHeight: 28, paddingVertical: 0, marginLeft: "auto" },
  track: { height: touch, touchAction: "none", cursor: "ew-resize", userSelect: "none" },
});
