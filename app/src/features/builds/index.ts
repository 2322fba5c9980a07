export { BuildScreen } from "./BuildScreen.tsx";
export { BuildsScreen } from "./BuildsScreen.tsx";
