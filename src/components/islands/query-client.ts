import { QueryClient } from "@tanstack/react-query";

/** One cache for all islands of a page: they are separate React trees but share this module. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: { staleTime: 30_000, retry: false, refetchOnWindowFocus: true },
    mutations: { retry: false },
  },
});
