export { SheetsScreen } from "./SheetsScreen.tsx";
