import { Slot } from "expo-router";
import { PublicFrame } from "@/features/frame/index.ts";

export default function PublicLayout() {
  return (
    <PublicFrame>
      <Slot />
    </PublicFrame>
  );
}
