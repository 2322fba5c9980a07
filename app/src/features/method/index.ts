export { MethodScreen } from "./MethodScreen.tsx";
