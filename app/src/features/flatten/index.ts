export { FlattenProvider } from "./FlattenProvider.tsx";
export { FlattenScreen } from "./FlattenScreen.tsx";
