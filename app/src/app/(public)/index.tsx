import { LandingScreen } from "@/features/landing/index.ts";

export default function LandingRoute() {
  return <LandingScreen />;
}
