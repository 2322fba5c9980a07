import { QueryClientProvider } from "@tanstack/react-query";
import { Slot } from "expo-router";
import { useState } from "react";
import { buildQueryClient } from "@/api/queryClient.ts";
import { installStylesheet } from "@/ui/theme/stylesheet.ts";
import { ThemeProvider } from "@/ui/theme/ThemeProvider.tsx";

installStylesheet();

export { ErrorBoundary } from "@/ui/CrashScreen.tsx";

export default function RootLayout() {
  const [queryClient] = useState(buildQueryClient);
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeProvider>
        <Slot />
      </ThemeProvider>
    </QueryClientProvider>
  );
}
