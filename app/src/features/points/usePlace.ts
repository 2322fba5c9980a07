import { useLocalSearchParams, useRouter } from "expo-router";
import { useCallback } from "react";
import { useIsWide } from "@/ui/useMediaQuery.ts";
import { isSection, type SectionId } from "./setup/sections.ts";

export interface Place {
  /** The chosen hardpoint, by its path in the axle document. */
  readonly point: string | null;
  readonly section: SectionId | null;
  readonly openPoint: (hardpoint: string) => void;
  readonly openSection: (section: SectionId) => void;
  /** Back to the hardpoints, or on a phone to the list of all there is. */
  readonly openList: () => void;
}

/** What is being edited, kept in the address. On a phone every place is a page of its own that Back leads out of. */
export function usePlace(): Place {
  const params = useLocalSearchParams<{ point?: string; edit?: string }>();
  const router = useRouter();
  const isWide = useIsWide();
  const go = useCallback(
    (to: { point?: string | undefined; edit?: string | undefined }) => {
      if (isWide) router.setParams(to);
      else router.push({ pathname: window.location.pathname as never, params: withoutMissing(to) });
    },
    [router, isWide],
  );
  const { point = null } = params;
  return {
    point,
    section: isSection(params.edit) ? params.edit : null,
    openPoint: useCallback(
      (hardpoint: string) => {
        if (hardpoint !== point) go({ point: hardpoint, edit: undefined });
      },
      [go, point],
    ),
    openSection: useCallback((section: SectionId) => go({ edit: section, point: undefined }), [go]),
    openList: useCallback(() => go({ edit: undefined, point: undefined }), [go]),
  };
}

function withoutMissing(params: Readonly<Record<string, string | undefined>>): Record<string, string> {
  return Object.fromEntries(
    Object.entries(params).filter((entry): entry is [string, string] => entry[1] !== undefined),
  );
}
