import type { LengthUnit } from "@linkwright/contract";
import { useQuery } from "@tanstack/react-query";
import { meQuery } from "@/api/auth.ts";
import { DIALECT_WORDS, type Dialect, type DialectWord, localeOf } from "@/lib/dialect.ts";

export interface PersonPreferences {
  readonly units: LengthUnit;
  readonly dialect: Dialect;
  readonly words: Readonly<Record<DialectWord, string>>;
  readonly locale: string;
}

/** The person's own choice, or what their browser suggests while nobody is signed in. */
export function usePreferences(): PersonPreferences {
  // Reads what the frame above has loaded; asks nothing itself.
  const { data: me } = useQuery({ ...meQuery, enabled: false });
  const dialect = me?.preferences.dialect ?? (navigator.language === "en-US" ? "us" : "uk");
  const units = me?.preferences.units ?? "mm";
  return { units, dialect, words: DIALECT_WORDS[dialect], locale: localeOf(dialect) };
}
