import { QueryClient } from "@tanstack/react-query";
import { ApiError } from "./api.ts";

/** Tries again only what may pass by itself: a lost connection or a fault of the server's. */
function worthAnotherTry(failures: number, error: Error): boolean {
  if (!(error instanceof ApiError)) return false;
  return failures < 2 && (error.code === "offline" || error.status >= 500);
}

/** A cache for one page rendered on the server, or for one open tab. */
export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { staleTime: 30_000, retry: typeof window === "undefined" ? false : worthAnotherTry },
    },
  });
}
