import { Slot } from "expo-router";
import { installStylesheet } from "@/ui/theme/stylesheet.ts";
import { ThemeProvider } from "@/ui/theme/ThemeProvider.tsx";

installStylesheet();

export default function RootLayout() {
  return (
    <ThemeProvider>
      <Slot />
    </ThemeProvider>
  );
}
