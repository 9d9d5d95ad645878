import { QueryClient, useQuery } from "@tanstack/react-query";
import { useSyncExternalStore } from "react";
import { call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi, kitKeys } from "#src/components/islands/kit-address.ts";
import { queryClient } from "#src/components/islands/query-client.ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/plan.ts";
import type { KitPlan } from "#src/server/kit-plan.ts";
import { overlaid } from "./save-edits.ts";

const never = () => () => {};

/** False while the page is rendered on the server and taken over, so that both say the same; then true. */
function useTakenOver(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}

/** While a page is rendered on the server nothing may be kept: the process serves everybody. */
const cache = import.meta.env.SSR ? () => new QueryClient() : () => queryClient;

export interface HeldPlan {
  held: KitPlan | undefined;
  /** Set when the plan could not be fetched. */
  error: Error | null;
  retry: () => void;
}

/** The kit's plan as this screen has it: from the server, with unsaved edits on top. */
export function usePlan(address: KitAddress): HeldPlan {
  const takenOver = useTakenOver();
  const { data, error, refetch } = useQuery(
    {
      queryKey: kitKeys.plan(address.kit),
      queryFn: async () => overlaid(address, await call<typeof GET>("GET", kitApi(address, "/plan"))),
    },
    cache(),
  );
  return { held: takenOver ? data : undefined, error, retry: () => void refetch() };
}
