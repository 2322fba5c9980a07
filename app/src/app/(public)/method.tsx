import { MethodScreen } from "@/features/method/index.ts";

export default function MethodRoute() {
  return <MethodScreen />;
}
