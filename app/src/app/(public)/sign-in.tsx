import { SignInScreen } from "@/features/auth/index.ts";

export default function SignInRoute() {
  return <SignInScreen />;
}
