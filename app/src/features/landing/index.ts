export { LandingScreen } from "./LandingScreen.tsx";
