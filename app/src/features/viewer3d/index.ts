export { LinkageView, type LinkageViewProps } from "./LinkageView.tsx";
export type { ViewName } from "./viewPlaces.ts";
