export { FaultsProvider, useKnownFaults } from "./FaultsProvider.tsx";
export { linkInWords } from "./linkWords.ts";
export type { FaultPlace, FaultReport, NamedBand } from "./reports.ts";
export { reportFaults } from "./reports.ts";
export { SafetyBanner } from "./SafetyBanner.tsx";
export { formatSteer, leftLockSign, steerInWords } from "./steerWords.ts";
