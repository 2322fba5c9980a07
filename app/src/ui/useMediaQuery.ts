import { useCallback, useSyncExternalStore } from "react";
import { breakpoint } from "./theme/tokens.ts";

export function useMediaQuery(query: string): boolean {
  const subscribe = useCallback(
    (notify: () => void) => {
      const list = window.matchMedia(query);
      list.addEventListener("change", notify);
      return () => list.removeEventListener("change", notify);
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () => window.matchMedia(query).matches);
}

/** Wide screens show side by side what a phone shows one at a time. */
export function useIsWide(): boolean {
  return useMediaQuery(`(min-width: ${breakpoint.wide}px)`);
}

export function useIsMedium(): boolean {
  return useMediaQuery(`(min-width: ${breakpoint.medium}px)`);
}

export function usePrefersReducedMotion(): boolean {
  return useMediaQuery("(prefers-reduced-motion: reduce)");
}
