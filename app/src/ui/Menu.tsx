import { type ReactNode, useEffect, useId, useRef, useState } from "react";
import { StyleSheet, View } from "react-native";
import { DomButton, DomDiv } from "./dom.tsx";
import { color, corner, space, touch } from "./theme/tokens.ts";

interface MenuProps {
  /** What the button says to a screen reader. */
  readonly label: string;
  readonly button: ReactNode;
  /** Links and buttons; a press on any of them closes the menu. */
  readonly children: ReactNode;
}

/** A button that opens a short list below itself. Escape, a press elsewhere, or tabbing out closes it. */
export function Menu({ label, button, children }: MenuProps) {
  const [isOpen, setIsOpen] = useState(false);
  const root = useRef<HTMLDivElement>(null);
  const opener = useRef<HTMLButtonElement>(null);
  const listId = useId();

  useEffect(() => {
    if (!isOpen) return;
    const closeOutside = (event: Event) => {
      if (event.target instanceof Node && !root.current?.contains(event.target)) setIsOpen(false);
    };
    const closeOnEscape = (event: KeyboardEvent) => {
      if (event.key !== "Escape") return;
      setIsOpen(false);
      opener.current?.focus();
    };
    document.addEventListener("pointerdown", closeOutside);
    document.addEventListener("focusin", closeOutside);
    document.addEventListener("keydown", closeOnEscape);
    return () => {
      document.removeEventListener("pointerdown", closeOutside);
      document.removeEventListener("focusin", closeOutside);
      document.removeEventListener("keydown", closeOnEscape);
    };
  }, [isOpen]);

  return (
    <DomDiv ref={root} style={styles.root}>
      <DomButton
        ref={opener}
        className="button button-quiet"
        aria-label={label}
        aria-expanded={isOpen}
        aria-controls={listId}
        onClick={() => setIsOpen(!isOpen)}
        style={styles.opener}
      >
        {button}
      </DomButton>
      {isOpen ? (
        <DomDiv id={listId} style={styles.list} onClick={() => setIsOpen(false)}>
          <View>{children}</View>
        </DomDiv>
      ) : null}
    </DomDiv>
  );
}

const styles = StyleSheet.create({
  root: { position: "relative", display: "flex" },
  opener: {
    minWidth: touch,
    minHeight: touch,
    borderWidth: 0,
    backgroundColor: "transparent",
    cursor: "pointer",
    paddingHorizontal: space.s,
    display: "flex",
    alignItems: "center",
    justifyContent: "center",
    borderRadius: corner,
  },
  list: {
    position: "absolute",
    top: touch + 4,
    right: 0,
    zIndex: 30,
    minWidth: 240,
    maxWidth: "92vw" as never,
    backgroundColor: color.panel,
    borderWidth: 1,
    borderStyle: "solid",
    borderColor: color.rule,
    borderRadius: corner,
    paddingVertical: space.xs,
    boxShadow: "0 8px 28px rgba(5, 10, 24, 0.25)",
  },
});
