import { useEffect } from "react";
import { useStudy } from "@/features/study/index.ts";
import { isUntyped } from "./untyped.ts";

/** Ctrl or ⌘ Z in a number field that nothing was typed into undoes the last change of the drawing. */
export function useFieldUndo(): void {
  const { undo, redo, mayEdit } = useStudy();
  useEffect(() => {
    if (!mayEdit) return;
    const listen = (event: KeyboardEvent) => {
      const { target } = event;
      const key = event.key.toLowerCase();
      if (!(event.ctrlKey || event.metaKey) || (key !== "z" && key !== "y")) return;
      if (!(target instanceof HTMLInputElement) || target.getAttribute("role") !== "spinbutton") return;
      if (!isUntyped(target.value, Number(target.getAttribute("aria-valuenow")))) return;
      event.preventDefault();
      if (key === "y" || event.shiftKey) redo();
      else undo();
    };
    window.addEventListener("keydown", listen);
    return () => window.removeEventListener("keydown", listen);
  }, [undo, redo, mayEdit]);
}
