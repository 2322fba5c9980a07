// What of a study is edited beside its hardpoints.

export const SECTIONS = [
  { id: "wheel", title: "Wheel and alignment" },
  { id: "steering", title: "Steering" },
  { id: "heights", title: "Ride heights" },
  { id: "targets", title: "Targets" },
  { id: "body", title: "Car" },
] as const;

export type SectionId = (typeof SECTIONS)[number]["id"];

export function isSection(text: string | undefined): text is SectionId {
  return SECTIONS.some(({ id }) => id === text);
}
