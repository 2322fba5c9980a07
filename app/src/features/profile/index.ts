export { ProfileScreen } from "./ProfileScreen.tsx";
