import { FlattenScreen } from "@/features/flatten/index.ts";

export default function FlattenRoute() {
  return <FlattenScreen />;
}
