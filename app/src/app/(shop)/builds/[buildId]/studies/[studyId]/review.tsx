import { ReviewScreen } from "@/features/review/index.ts";

export default function ReviewRoute() {
  return <ReviewScreen />;
}
