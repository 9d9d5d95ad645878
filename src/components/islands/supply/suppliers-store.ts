import { useQuery } from "@tanstack/react-query";
import { call } from "#src/components/islands/call.ts";
import type { RowChange } from "#src/components/islands/cells/cell-column.ts";
import type { SheetStore } from "#src/components/islands/cells/use-sheet.ts";
import { pageCache, queryClient } from "#src/components/islands/query-client.ts";
import type { DELETE, PATCH } from "#src/pages/api/workshops/[workshop]/suppliers/[supplier].ts";
import type { GET, POST } from "#src/pages/api/workshops/[workshop]/suppliers.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import type { SupplierFields } from "#src/shapes/supplier.ts";
import { figuresChanged, supplyKeys } from "./supply-keys.ts";

function api(workshop: string, rest = ""): string {
  return `/api/workshops/${workshop}/suppliers${rest}`;
}

function hold(workshop: string, how: (rows: readonly SupplierView[]) => SupplierView[]): void {
  queryClient.setQueryData<SupplierView[]>(supplyKeys.suppliers(workshop), (rows) => rows && how(rows));
}

/** The suppliers as this screen has them; `first` came with the page. */
export function useSuppliers(workshop: string, first: SupplierView[]): SupplierView[] {
  const { data } = useQuery(
    {
      queryKey: supplyKeys.suppliers(workshop),
      queryFn: () => call<typeof GET>("GET", api(workshop)),
      initialData: first,
    },
    pageCache(),
  );
  return data;
}

/** Adds a supplier. @throws CallFailed */
export async function addSupplier(workshop: string, fields: SupplierFields): Promise<SupplierView> {
  const added = await call<typeof POST>("POST", api(workshop), fields);
  hold(workshop, (rows) => [...rows, added].sort((a, b) => a.name.localeCompare(b.name)));
  return added;
}

/** Changes a supplier. @throws CallFailed */
export async function changeSupplier(
  workshop: string,
  { id, version, change }: Pick<RowChange<SupplierFields>, "id" | "version" | "change">,
): Promise<SupplierView> {
  const changed = await call<typeof PATCH>("PATCH", api(workshop, `/${id}`), { ...change, version });
  hold(workshop, (rows) => rows.map((row) => (row.id === id ? changed : row)));
  figuresChanged();
  return changed;
}

/** Removes a supplier with its offers. @throws CallFailed */
export async function removeSupplier(
  workshop: string,
  { id, version }: Pick<SupplierView, "id" | "version">,
): Promise<{ offers: number }> {
  const gone = await call<typeof DELETE>("DELETE", api(workshop, `/${id}?version=${version}`));
  hold(workshop, (rows) => rows.filter((row) => row.id !== id));
  figuresChanged();
  return gone;
}

/** The suppliers as rows of a sheet. */
export function suppliersStore(workshop: string): SheetStore<SupplierView, SupplierFields> {
  return {
    now: () => queryClient.getQueryData<SupplierView[]>(supplyKeys.suppliers(workshop)) ?? [],
    put: (changed) =>
      hold(workshop, (rows) => rows.map((row) => changed.find(({ id }) => id === row.id) ?? row)),
    save(changes) {
      return Promise.all(changes.map((change) => changeSupplier(workshop, change)));
    },
    oneByOne: true,
    refused: (at) => ({ place: 0, at }),
  };
}
