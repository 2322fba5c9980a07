export { SignInScreen } from "./SignInScreen.tsx";
export { SignUpScreen } from "./SignUpScreen.tsx";
