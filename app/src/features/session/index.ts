export { SessionGate } from "./SessionGate.tsx";
export { type PersonPreferences, usePreferences } from "./usePreferences.ts";
export { useCurrentPerson, useWorkshop, type Workshop } from "./workshop.ts";
