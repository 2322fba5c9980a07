import { useState } from "react";
import { readStored, removeStored, writeStored } from "./storage.ts";

/** Text that is being written, kept on the device under `key` until it is cleared: leaving the page loses nothing. */
export function useStoredText(key: string): readonly [string, (text: string) => void] {
  const storageKey = `linkwright.text.${key}`;
  const [text, setText] = useState(() => readStored(storageKey) ?? "");
  const keep = (next: string) => {
    setText(next);
    if (next === "") removeStored(storageKey);
    else writeStored(storageKey, next);
  };
  return [text, keep];
}
