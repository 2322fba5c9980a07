import { QueryClient } from "@tanstack/react-query";
import { isPassing } from "@/lib/problem.ts";

const MOST_RETRIES = 2;
const FRESH_MS = 15_000;

export function buildQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: FRESH_MS,
        // Only what may pass by itself; everything else is told at once.
        retry: (failures, error) => isPassing(error) && failures < MOST_RETRIES,
        retryDelay: (attempt) => 500 * 2 ** attempt,
        // A request without a network fails and says so; the library's default would wait without a word.
        networkMode: "always",
      },
      mutations: { retry: false, networkMode: "always" },
    },
  });
}
