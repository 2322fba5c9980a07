import { ProfileScreen } from "@/features/profile/index.ts";

export default function ProfileRoute() {
  return <ProfileScreen />;
}
