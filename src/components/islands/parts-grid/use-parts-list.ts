import { QueryClient, useQuery } from "@tanstack/react-query";
import { call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi, kitKeys } from "#src/components/islands/kit-address.ts";
import { queryClient } from "#src/components/islands/query-client.ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/revisions/last.ts";
import type { PartsList } from "#src/server/present.ts";
import { fetchList } from "./list-editor.ts";

/** While a page is rendered on the server nothing may be kept: the process serves everybody. */
const cache = import.meta.env.SSR ? () => new QueryClient() : () => queryClient;

/** The kit's parts list as this screen has it: from the server, with unsaved edits on top. */
export function usePartsList(address: KitAddress): {
  list: PartsList | undefined;
  error: Error | null;
  retry: () => void;
} {
  const { data, error, refetch } = useQuery(
    { queryKey: kitKeys.lines(address.kit), queryFn: () => fetchList(address) },
    cache(),
  );
  return { list: data, error, retry: () => void refetch() };
}

/** The list as it stood when the last revision ended; not asked for while the first one lasts. */
export function useLastRevision(address: KitAddress, revision: string) {
  const { data } = useQuery(
    {
      queryKey: ["revision", address.kit, revision],
      queryFn: () => call<typeof GET>("GET", kitApi(address, "/revisions/last")),
      enabled: revision !== "A",
    },
    cache(),
  );
  return data ?? null;
}
