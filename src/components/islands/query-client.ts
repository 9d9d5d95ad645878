import { QueryClient } from "@tanstack/react-query";

/** One cache for all islands of a page: they are separate React trees but share this module. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: { staleTime: 30_000, retry: false, refetchOnWindowFocus: true },
    mutations: { retry: false },
  },
});

/** The cache a component asks. While a page is rendered on the server nothing may be kept: it serves everybody. */
export const pageCache: () => QueryClient = import.meta.env.SSR ? () => new QueryClient() : () => queryClient;
