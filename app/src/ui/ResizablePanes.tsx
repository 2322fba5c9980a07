import { Fragment, type ReactNode } from "react";
import { Group, Panel, Separator, useDefaultLayout } from "react-resizable-panels";
import { readStored, writeStored } from "@/lib/storage.ts";

export interface Pane {
  readonly id: string;
  /** Names the pane for screen readers. */
  readonly label: string;
  readonly content: ReactNode;
  /** Share of the whole, in percent. */
  readonly size: number;
  /** In pixels. */
  readonly minSize: number;
}

interface ResizablePanesProps {
  /** What the sizes are remembered under. */
  readonly id: string;
  readonly panes: readonly Pane[];
  readonly orientation?: "horizontal" | "vertical";
}

/** Sizes are kept between visits where storage is allowed, and fall back to the defaults where not. */
const layoutStorage = {
  getItem: (key: string) => readStored(key),
  setItem: (key: string, value: string) => {
    writeStored(key, value);
  },
};

/** Panes side by side with handles between them, moved by pointer or arrow keys. Fills its parent. */
export function ResizablePanes({ id, panes, orientation = "horizontal" }: ResizablePanesProps) {
  const layout = useDefaultLayout({
    id: `linkwright.panes.${id}`,
    panelIds: panes.map((pane) => pane.id),
    storage: layoutStorage,
  });
  return (
    <Group
      id={id}
      orientation={orientation}
      defaultLayout={layout.defaultLayout}
      onLayoutChanged={layout.onLayoutChanged}
    >
      {panes.map((pane, index) => (
        <Fragment key={pane.id}>
          {index > 0 ? (
            <Separator
              className={`pane-handle pane-handle-${orientation}`}
              aria-label={`Width of ${panes[index - 1]?.label} and ${pane.label}`}
            />
          ) : null}
          <Panel id={pane.id} defaultSize={`${pane.size}%`} minSize={pane.minSize}>
            <section aria-label={pane.label} className="pane">
              {pane.content}
            </section>
          </Panel>
        </Fragment>
      ))}
    </Group>
  );
}
