import { queryClient } from "#src/components/islands/query-client.ts";

/** Keys of the shared cache for what belongs to a workshop's supply. */
export const supplyKeys = {
  suppliers: (workshop: string) => ["suppliers", workshop] as const,
  rates: (workshop: string) => ["rates", workshop] as const,
  supplierOffers: (supplier: string) => ["supplier-offers", supplier] as const,
};

/** Every kit's figures may have changed: they are fetched again where they are shown. */
export function figuresChanged(): void {
  void queryClient.invalidateQueries({ queryKey: ["plan"] });
}
