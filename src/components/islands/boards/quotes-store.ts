import { useQuery } from "@tanstack/react-query";
import { call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi, kitKeys } from "#src/components/islands/kit-address.ts";
import { saving } from "#src/components/islands/plan/saving.ts";
import { pageCache, queryClient } from "#src/components/islands/query-client.ts";
import type { DELETE, PATCH } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/quotes/[quote].ts";
import type { POST } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/quotes.ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards.ts";
import type { BoardQuoteView, BoardsView } from "#src/server/board-changes.ts";
import type { BoardQuoteFields } from "#src/shapes/board-quote.ts";

/** The kit's quotes and panel terms as this screen has them; `first` came with the page. */
export function useBoards(address: KitAddress, first: BoardsView): BoardsView {
  const { data } = useQuery(
    {
      queryKey: kitKeys.boards(address.kit),
      queryFn: () => call<typeof GET>("GET", kitApi(address, "/boards")),
      initialData: first,
    },
    pageCache(),
  );
  return data;
}

/** Puts what was saved into what this screen has; the plan is fetched anew. */
export function holdBoards(address: KitAddress, how: (boards: BoardsView) => BoardsView): void {
  queryClient.setQueryData<BoardsView>(kitKeys.boards(address.kit), (held) => held && how(held));
  saving.change((now) => ({ ...now, savedAt: Date.now(), lostAt: null }));
  void queryClient.invalidateQueries({ queryKey: kitKeys.plan(address.kit) });
}

function hold(address: KitAddress, how: (quotes: BoardQuoteView[]) => BoardQuoteView[]): void {
  holdBoards(address, (boards) => ({ ...boards, quotes: how(boards.quotes) }));
}

/** Adds a quote. @throws CallFailed */
export async function addQuote(address: KitAddress, fields: BoardQuoteFields): Promise<void> {
  const added = await call<typeof POST>("POST", kitApi(address, "/boards/quotes"), fields);
  hold(address, (quotes) => [...quotes, added]);
}

/** Changes a quote. @throws CallFailed */
export async function changeQuote(
  address: KitAddress,
  { id, version }: Pick<BoardQuoteView, "id" | "version">,
  fields: BoardQuoteFields,
): Promise<void> {
  const path = kitApi(address, `/boards/quotes/${id}`);
  const changed = await call<typeof PATCH>("PATCH", path, { ...fields, version });
  hold(address, (quotes) => quotes.map((quote) => (quote.id === id ? changed : quote)));
}

/** Removes a quote. @throws CallFailed */
export async function removeQuote(
  address: KitAddress,
  { id, version }: Pick<BoardQuoteView, "id" | "version">,
): Promise<void> {
  await call<typeof DELETE>("DELETE", kitApi(address, `/boards/quotes/${id}?version=${version}`));
  hold(address, (quotes) => quotes.filter((quote) => quote.id !== id));
}
