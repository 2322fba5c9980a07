import { SignUpScreen } from "@/features/auth/index.ts";

export default function SignUpRoute() {
  return <SignUpScreen />;
}
