import { Suspense, useLayoutEffect, useState } from "react";
import { createChannel } from "./channel.ts";
import { FlatView } from "./FlatView.tsx";
import type { Mark } from "./parts.ts";
import { SceneBoundary } from "./SceneBoundary.tsx";
import type { Drawing } from "./scene/linkage.ts";
import type { SceneModel } from "./sceneModel.ts";
import type { SceneStage } from "./useSceneStage.ts";
import type { EyeControl } from "./useViewpoint.ts";
import type { Viewport } from "./viewpoint.ts";

interface PictureProps {
  readonly host: HTMLElement;
  readonly model: SceneModel;
  readonly emphasis: Mark | null;
  readonly eye: EyeControl;
  readonly viewport: Viewport;
  readonly stage: SceneStage;
}

/** In three dimensions where it can be, flat until then and where it cannot. */
export function Picture({ host, model, emphasis, eye, viewport, stage }: PictureProps) {
  const { status, Scene, attempt } = stage;
  const [drawing] = useState(() => createChannel<Drawing>({ model, emphasis }));
  useLayoutEffect(() => drawing.set({ model, emphasis }), [drawing, model, emphasis]);
  return (
    <>
      {status === "loading" || status === "drawn" ? (
        <SceneBoundary key={attempt} onFailed={stage.tellFailed}>
          <Suspense fallback={null}>
            <Scene
              host={host}
              viewpoint={eye.viewpoint}
              drawing={drawing}
              limits={eye.limits}
              onFirstPicture={stage.tellDrawn}
              onHand={eye.takeOver}
              onContextLost={stage.tellLost}
            />
          </Suspense>
        </SceneBoundary>
      ) : null}
      {status === "drawn" ? null : (
        <FlatView
          model={model}
          viewpoint={eye.viewpoint}
          viewport={viewport}
          chosen={emphasis?.path ?? null}
        />
      )}
    </>
  );
}
