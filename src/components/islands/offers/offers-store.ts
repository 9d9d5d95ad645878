import { useQuery } from "@tanstack/react-query";
import { call } from "#src/components/islands/call.ts";
import type { SheetStore } from "#src/components/islands/cells/use-sheet.ts";
import { type KitAddress, kitApi, kitKeys } from "#src/components/islands/kit-address.ts";
import { saving } from "#src/components/islands/plan/saving.ts";
import { pageCache, queryClient } from "#src/components/islands/query-client.ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/kits/[kit]/offers.ts";
import type { DELETE, PATCH } from "#src/pages/api/workshops/[workshop]/offers/[offer].ts";
import type { POST as POST_BATCH } from "#src/pages/api/workshops/[workshop]/offers.ts";
import type { POST } from "#src/pages/api/workshops/[workshop]/parts/[part]/offers.ts";
import type { KitOffers } from "#src/server/kit-offers.ts";
import type { BatchView, OfferView } from "#src/server/offer-changes.ts";
import type { OfferBatch, OfferFields } from "#src/shapes/offer.ts";

function api({ workshop }: KitAddress, rest: string): string {
  return `/api/workshops/${workshop}${rest}`;
}

/** The offers of a kit as this screen has them; `first` came with the page. */
export function useKitOffers(address: KitAddress, first: KitOffers): KitOffers {
  const { data } = useQuery(
    {
      queryKey: kitKeys.offers(address.kit),
      queryFn: () => call<typeof GET>("GET", kitApi(address, "/offers")),
      initialData: first,
    },
    pageCache(),
  );
  return data;
}

export function heldOffers({ kit }: KitAddress): KitOffers | undefined {
  return queryClient.getQueryData<KitOffers>(kitKeys.offers(kit));
}

export function holdOffers({ kit }: KitAddress, how: (held: KitOffers) => KitOffers): void {
  queryClient.setQueryData<KitOffers>(kitKeys.offers(kit), (held) => held && how(held));
}

/** What was saved is shown, and the figures are worked out again. */
export function offersSaved(address: KitAddress): void {
  saving.change((now) => ({ ...now, savedAt: Date.now(), lostAt: null }));
  void queryClient.invalidateQueries({ queryKey: kitKeys.plan(address.kit) });
}

function put(address: KitAddress, changed: readonly OfferView[]): void {
  holdOffers(address, (held) => ({
    ...held,
    offers: held.offers.map((offer) => changed.find(({ id }) => id === offer.id) ?? offer),
  }));
}

/** Adds an offer for a part. @throws CallFailed */
export async function addOffer(address: KitAddress, part: string, fields: OfferFields): Promise<OfferView> {
  const added = await call<typeof POST>("POST", api(address, `/parts/${part}/offers`), fields);
  holdOffers(address, (held) => ({ ...held, offers: [...held.offers, added] }));
  offersSaved(address);
  return added;
}

/** Changes an offer. @throws CallFailed */
export async function changeOffer(
  address: KitAddress,
  { id, version }: Pick<OfferView, "id" | "version">,
  change: Partial<OfferFields>,
): Promise<OfferView> {
  const changed = await call<typeof PATCH>("PATCH", api(address, `/offers/${id}`), { ...change, version });
  put(address, [changed]);
  offersSaved(address);
  return changed;
}

/** Removes an offer. @throws CallFailed */
export async function removeOffer(
  address: KitAddress,
  { id, version }: Pick<OfferView, "id" | "version">,
): Promise<void> {
  await call<typeof DELETE>("DELETE", api(address, `/offers/${id}?version=${version}`));
  holdOffers(address, (held) => ({ ...held, offers: held.offers.filter((offer) => offer.id !== id) }));
  offersSaved(address);
}

/** Many changes at once, all or none. @throws CallFailed */
export async function saveBatch(address: KitAddress, batch: OfferBatch): Promise<BatchView> {
  const saved = await call<typeof POST_BATCH>("POST", api(address, "/offers"), batch);
  put(address, saved.changed);
  const gone = new Set(batch.remove?.map(({ id }) => id));
  holdOffers(address, (held) => ({
    ...held,
    offers: [...held.offers.filter(({ id }) => !gone.has(id)), ...saved.added],
  }));
  offersSaved(address);
  return saved;
}

/** The kit's offers as rows of a sheet. */
export function offersSheet(address: KitAddress): SheetStore<OfferView, OfferFields> {
  return {
    now: () => heldOffers(address)?.offers ?? [],
    put: (rows) => put(address, rows),
    async save(changes) {
      const change = changes.map(({ id, version, change }) => ({ ...change, id, version }));
      return (await saveBatch(address, { change })).changed;
    },
    refused(path) {
      const [, place = "0", ...at] = path.split(".");
      return { place: Number(place), at: at.join(".") };
    },
  };
}
