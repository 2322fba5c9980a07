export { ReviewScreen } from "./ReviewScreen.tsx";
