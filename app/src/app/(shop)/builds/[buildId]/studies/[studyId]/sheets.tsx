import { SheetsScreen } from "@/features/sheets/index.ts";

export default function SheetsRoute() {
  return <SheetsScreen />;
}
