import { type Axle, type Fault, type Side, steeringUnit } from "@linkwright/kinematics";
import { useId, useMemo, useSyncExternalStore } from "react";
import { StyleSheet, View } from "react-native";
import { cssClass, DomDiv } from "../../ui/dom.tsx";
import { Text } from "../../ui/Text.tsx";
import { dyedSteel, space } from "../../ui/theme/tokens.ts";
import { usePrefersReducedMotion } from "../../ui/useMediaQuery.ts";
import { useSize } from "../../ui/useSize.ts";
import { steerInWords } from "../safety/index.ts";
import { usePreferences } from "../session/index.ts";
import {
  altText,
  ghostsInWords,
  missingInWords,
  redFaultInWords,
  type Situation,
  viewInWords,
  whereFrom,
} from "./describe.ts";
import { Picture } from "./Picture.tsx";
import { findRod } from "./sceneModel.ts";
import { BACKDROP } from "./tones.ts";
import { useHost } from "./useHost.ts";
import { usePicture } from "./usePicture.ts";
import { useSceneStage } from "./useSceneStage.ts";
import { type EyeControl, useViewpoint } from "./useViewpoint.ts";
import { ViewButtons } from "./ViewButtons.tsx";
import { ViewNotices } from "./ViewNotices.tsx";
import { extentOf, type ViewName } from "./viewPlaces.ts";

export interface LinkageViewProps {
  readonly axle: Axle;
  /** Wheel travel from design of each side. */
  readonly travel: Readonly<Record<Side, number>>;
  readonly steer: number;
  /** Where toe is set; 0 is the design height. */
  readonly wheelUp: number;
  /** A hardpoint shown as chosen, by its path in the axle document. */
  readonly highlight?: string | null;
  readonly onPick?: (path: string) => void;
  /** Travels from design at which the wheels are drawn as thin ghosts. */
  readonly ghosts?: readonly number[];
  /** The view it opens with, and goes to when this changes; the person may choose others. */
  readonly view?: ViewName;
  readonly faults?: readonly Fault[];
}

const NO_GHOSTS: readonly number[] = [];
const NO_FAULTS: readonly Fault[] = [];
/** Pixels that the caption and the buttons cover, and half the width of LEFT and RIGHT. */
const INSETS = { top: 44, side: 26, bottom: 78 } as const;
/** Pixels: the buttons' long words need this much. */
const ROOM_FOR_WORDS = 500;
const HELP =
  "Arrow keys turn the picture, with Shift they move it, plus and minus zoom, Home puts it back. The same points stand in the hardpoint table.";

/** The linkage in space, as it stands at a travel and a steer. Fills its parent. */
export function LinkageView({
  ghosts = NO_GHOSTS,
  faults = NO_FAULTS,
  highlight = null,
  ...props
}: LinkageViewProps) {
  const { axle, travel, steer, wheelUp, view = "threeQuarter" } = props;
  const [hostRef, viewport] = useSize<HTMLDivElement>();
  const { units: unit, words } = usePreferences();
  const model = usePicture({ axle, travel, steer, wheelUp, ghosts, faults });
  const points = useMemo(() => extentOf(axle), [axle]);
  const rod = findRod(model);
  const mayGlide = !usePrefersReducedMotion();
  const eye = useViewpoint({ view, points, tieRod: rod?.ends ?? null, viewport, insets: INSETS, mayGlide });
  const stage = useSceneStage();
  const { hovered, handlers } = useHost({ eye, marks: model.marks, viewport, onPick: props.onPick });
  const emphasis = model.marks.find(({ path }) => path === (hovered ?? highlight)) ?? null;
  const caption = useCaption(eye, `${rod?.side ?? "left"} ${words.tieRod}`);
  const helpId = useId();
  const steering = steeringUnit(axle.steering) === null ? null : steerInWords(axle, steer, unit);
  const situation: Situation = { axle, travel, unit, steering };
  const captions = [caption, ghostsInWords(ghosts, unit)].filter((part) => part !== null);

  return (
    <View style={[cssClass("on-steel"), styles.frame]}>
      <DomDiv
        ref={hostRef}
        role="img"
        tabIndex={0}
        aria-label={altText(situation, caption, model.missing)}
        aria-describedby={helpId}
        style={[styles.host, hovered !== null && styles.overMark]}
        {...handlers}
      >
        {hostRef.current && viewport.width > 0 ? (
          <Picture
            host={hostRef.current}
            model={model}
            emphasis={emphasis}
            eye={eye}
            viewport={viewport}
            stage={stage}
          />
        ) : null}
      </DomDiv>
      <DomDiv id={helpId} className="visually-hidden">
        {HELP}
      </DomDiv>
      <View style={styles.head}>
        <Text variant="label" style={styles.caption} aria-hidden>
          {captions.join(" · ")}
        </Text>
        <ViewNotices
          status={stage.status}
          onRetry={stage.retry}
          fault={redFaultInWords(faults, words.tieRod)}
          missing={missingInWords(situation, model.missing)}
        />
      </View>
      <View style={styles.foot}>
        <ViewButtons
          settled={eye.settled}
          tieRod={words.tieRod}
          isNarrow={viewport.width < ROOM_FOR_WORDS}
          onView={eye.go}
        />
      </View>
    </View>
  );
}

/** From where the car is seen; told anew only when the words change, not with every frame of a turn. */
function useCaption({ viewpoint, settled }: EyeControl, rod: string): string {
  const turned = useSyncExternalStore(viewpoint.subscribe, () => whereFrom(viewpoint.get()));
  return settled === null ? turned : viewInWords(settled, rod);
}

const styles = StyleSheet.create({
  frame: {
    flex: 1,
    minHeight: 240,
    overflow: "hidden",
    position: "relative",
    backgroundColor: BACKDROP.edge,
    backgroundImage: `radial-gradient(ellipse at 50% 45%, ${BACKDROP.centre}, ${BACKDROP.edge} 75%)`,
  } as object,
  host: { position: "absolute", inset: 0, outlineOffset: -2, cursor: "grab", userSelect: "none" } as object,
  overMark: { cursor: "pointer" },
  head: {
    position: "absolute",
    top: space.m,
    left: space.l,
    right: space.l,
    gap: space.s,
    pointerEvents: "none",
  },
  caption: { color: dyedSteel.ink },
  foot: { position: "absolute", bottom: space.m, left: space.m, right: space.m, pointerEvents: "box-none" },
});
