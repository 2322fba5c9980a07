import { createContext, type ReactNode, useCallback, useContext, useEffect, useMemo, useState } from "react";
import { readStored, removeStored, writeStored } from "@/lib/storage.ts";
import { useMediaQuery } from "../useMediaQuery.ts";
import { awaitFonts } from "./fonts.ts";
import { type Palette, type Scheme, schemes } from "./tokens.ts";

export const THEME_CHOICES = ["system", "light", "dark"] as const;
export type ThemeChoice = (typeof THEME_CHOICES)[number];

/** Read before the first paint by public/theme.js, so the name is the same there. */
const STORAGE_KEY = "linkwright.theme";

interface Theme {
  readonly choice: ThemeChoice;
  readonly scheme: Scheme;
  /** For what cannot read CSS variables. */
  readonly palette: Palette;
  readonly chooseTheme: (choice: ThemeChoice) => void;
}

const ThemeContext = createContext<Theme | null>(null);

function storedChoice(): ThemeChoice {
  const stored = readStored(STORAGE_KEY);
  return stored === "light" || stored === "dark" ? stored : "system";
}

function useFontsSettled(): boolean {
  const [settled, setSettled] = useState(false);
  useEffect(() => {
    awaitFonts().then(() => setSettled(true));
  }, []);
  return settled;
}

export function ThemeProvider({ children }: { children: ReactNode }) {
  const [choice, setChoice] = useState(storedChoice);
  const prefersDark = useMediaQuery("(prefers-color-scheme: dark)");
  const fontsSettled = useFontsSettled();

  // Its identity stays, so that effects which set the theme do not run because it was set.
  const chooseTheme = useCallback((next: ThemeChoice) => {
    if (next === "system") {
      removeStored(STORAGE_KEY);
      delete document.documentElement.dataset.theme;
    } else {
      writeStored(STORAGE_KEY, next);
      document.documentElement.dataset.theme = next;
    }
    setChoice(next);
  }, []);

  const theme = useMemo<Theme>(() => {
    const scheme = choice === "system" ? (prefersDark ? "dark" : "light") : choice;
    return { choice, scheme, palette: schemes[scheme], chooseTheme };
  }, [choice, prefersDark, chooseTheme]);

  return <ThemeContext.Provider value={theme}>{fontsSettled ? children : null}</ThemeContext.Provider>;
}

export function useTheme(): Theme {
  const theme = useContext(ThemeContext);
  if (!theme) throw new Error("useTheme needs a ThemeProvider above it.");
  return theme;
}
