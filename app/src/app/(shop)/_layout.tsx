import { Slot } from "expo-router";
import { SessionGate } from "@/features/session/index.ts";

export default function ShopLayout() {
  return (
    <SessionGate>
      <Slot />
    </SessionGate>
  );
}
