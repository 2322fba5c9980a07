import { type ReactNode, useId, useLayoutEffect, useRef } from "react";
import { StyleSheet, View } from "react-native";
import { DomButton, DomDialog } from "./dom.tsx";
import { Heading } from "./Heading.tsx";
import { color, corner, space, touch } from "./theme/tokens.ts";
import { useIsMedium } from "./useMediaQuery.ts";

interface DialogProps {
  readonly title: string;
  readonly onClose: () => void;
  readonly children: ReactNode;
  /** Buttons; the one that does what the dialog is for stands last. */
  readonly actions?: ReactNode;
  readonly width?: number;
}

/**
 * Mounted is open. The browser's own modal dialog holds the focus and gives it back; a press beside it does not
 * close it, so that nothing typed is lost by a slip of the thumb.
 */
export function Dialog({ title, onClose, children, actions, width = 560 }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  const isMedium = useIsMedium();

  useLayoutEffect(() => {
    const element = dialog.current;
    element?.showModal();
    // The browser would take the first thing that can be focused, which is the way out.
    const field = element?.querySelector<HTMLElement>("input:not([type=radio]), textarea, select");
    (field ?? element?.querySelector("h2"))?.focus();
    return () => element?.close();
  }, []);

  return (
    <DomDialog
      ref={dialog}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      style={isMedium ? styles.centred : styles.sheet}
    >
      <View style={[styles.box, isMedium ? { width, maxWidth: "94vw" as never } : styles.sheetBox]}>
        <View style={styles.head}>
          <Heading level={2} nativeID={titleId} tabIndex={-1} style={styles.title}>
            {title}
          </Heading>
          <CloseButton onClose={onClose} />
        </View>
        <View style={styles.body}>{children}</View>
        {actions ? <View style={styles.actions}>{actions}</View> : null}
      </View>
    </DomDialog>
  );
}

function CloseButton({ onClose }: { onClose: () => void }) {
  return (
    <DomButton aria-label="Close" className="button button-quiet" onClick={onClose} style={styles.close}>
      <svg aria-hidden="true" width="16" height="16" viewBox="0 0 16 16">
        <path d="M2 2 14 14M14 2 2 14" stroke={color.ink} strokeWidth="1.8" />
      </svg>
    </DomButton>
  );
}

const styles = StyleSheet.create({
  centred: { margin: "auto" },
  sheet: { marginTop: "auto", marginBottom: 0, marginHorizontal: 0, width: "100%" },
  box: {
    backgroundColor: color.panel,
    borderWidth: 1,
    borderColor: color.rule,
    borderRadius: corner,
    maxHeight: "92dvh" as never,
    boxShadow: "0 12px 40px rgba(5, 10, 24, 0.35)",
  },
  sheetBox: { width: "100%", borderBottomWidth: 0 },
  head: {
    flexDirection: "row",
    alignItems: "center",
    paddingLeft: space.l,
    borderBottomWidth: 1,
    borderBottomColor: color.rule,
  },
  title: { flex: 1, paddingVertical: space.m },
  close: {
    width: touch + 4,
    height: touch + 4,
    borderWidth: 0,
    backgroundColor: "transparent",
    display: "flex",
    alignItems: "center",
    justifyContent: "center",
    cursor: "pointer",
  },
  body: { padding: space.l, gap: space.l, overflowY: "auto" } as object,
  actions: {
    flexDirection: "row",
    gap: space.m,
    padding: space.l,
    borderTopWidth: 1,
    borderTopColor: color.rule,
    justifyContent: "flex-end",
    flexWrap: "wrap",
  },
});
