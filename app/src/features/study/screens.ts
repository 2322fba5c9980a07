// The screens of a study, in the order of the work.

import type { Tab } from "@/ui/TabBar.tsx";

const SCREENS = [
  { key: "points", label: "Points", pathname: "/builds/[buildId]/studies/[studyId]/points" },
  { key: "curves", label: "Curves", pathname: "/builds/[buildId]/studies/[studyId]/curves" },
  { key: "flatten", label: "Flatten", pathname: "/builds/[buildId]/studies/[studyId]/flatten" },
  { key: "sheets", label: "Sheets", pathname: "/builds/[buildId]/studies/[studyId]/sheets" },
  { key: "review", label: "Review", pathname: "/builds/[buildId]/studies/[studyId]/review" },
] as const;

interface Place {
  readonly buildId: string;
  readonly studyId: string;
}

export function studyTabs({ buildId, studyId }: Place, openComments: number): Tab[] {
  return SCREENS.map(({ key, label, pathname }) => ({
    key,
    label,
    href: { pathname, params: { buildId, studyId } },
    ...(key === "review" && { count: openComments }),
  }));
}

/** The screen that an address shows. */
export function currentScreen(path: string): { readonly key: string; readonly label: string } {
  const last = path.split("/").at(-1);
  return SCREENS.find(({ key }) => key === last) ?? SCREENS[0];
}
