import { useEffect } from "react";
import { useStudy } from "./StudyContext.tsx";

/** Ctrl or ⌘ with Z, Shift Z and Y: undo and redo, except where a text is being written. */
export function useStudyKeys(): void {
  const { undo, redo, mayEdit } = useStudy();
  useEffect(() => {
    if (!mayEdit) return;
    const listen = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || isWriting(event.target)) return;
      const key = event.key.toLowerCase();
      if (key !== "z" && key !== "y") return;
      event.preventDefault();
      if (key === "y" || event.shiftKey) redo();
      else undo();
    };
    window.addEventListener("keydown", listen);
    return () => window.removeEventListener("keydown", listen);
  }, [undo, redo, mayEdit]);
}

function isWriting(target: EventTarget | null): boolean {
  return target instanceof HTMLElement && target.matches("input, textarea, select, [contenteditable=true]");
}
