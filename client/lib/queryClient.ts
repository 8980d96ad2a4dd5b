import { QueryClient } from "@tanstack/react-query";
import { ApiProblem } from "./ApiProblem";

/** What the server refused for a reason is not asked again; the rest is, twice. */
function mayRetry(failures: number, error: Error): boolean {
  if (error instanceof ApiProblem && error.status < 500) return false;
  return failures < 2;
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 60_000,
        gcTime: 15 * 60_000,
        retry: mayRetry,
        retryDelay: (failures) => 400 * 2 ** failures,
        refetchOnWindowFocus: false,
        // Ours tells by the answer, not by the browser's guess, whether there is a connection.
        networkMode: "always",
      },
      mutations: { networkMode: "always" },
    },
  });
}
