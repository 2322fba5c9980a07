export { KeptNotice } from "./components/KeptNotice.tsx";
export { StepChoice } from "./components/StepChoice.tsx";
export { StepperRow } from "./components/StepperRow.tsx";
export { EntryProvider } from "./entry/EntryProvider.tsx";
export { useStep } from "./entry/useStep.ts";
export { PointsScreen } from "./PointsScreen.tsx";
