import { NotFoundScreen } from "@/features/frame/index.ts";

export default function NotFoundRoute() {
  return <NotFoundScreen />;
}
