import { call } from "#src/components/islands/call.ts";
import { type KitAddress, kitApi } from "#src/components/islands/kit-address.ts";
import type {
  DELETE,
  PATCH,
} from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/panel-terms/[terms].ts";
import type { POST } from "#src/pages/api/workshops/[workshop]/kits/[kit]/boards/panel-terms.ts";
import type { PanelTermsView } from "#src/server/panel-terms-changes.ts";
import type { PanelTermsFields } from "#src/shapes/panel-terms.ts";
import { holdBoards } from "./quotes-store.ts";

type Seen = Pick<PanelTermsView, "id" | "version">;

function hold(address: KitAddress, how: (terms: PanelTermsView[]) => PanelTermsView[]): void {
  holdBoards(address, (boards) => ({ ...boards, panelTerms: how(boards.panelTerms) }));
}

/** Writes down a house's panels. @throws CallFailed */
export async function addTerms(address: KitAddress, fields: PanelTermsFields): Promise<void> {
  const added = await call<typeof POST>("POST", kitApi(address, "/boards/panel-terms"), fields);
  hold(address, (terms) => [...terms, added]);
}

/** Changes a house's panels. @throws CallFailed */
export async function changeTerms(address: KitAddress, seen: Seen, fields: PanelTermsFields): Promise<void> {
  const path = kitApi(address, `/boards/panel-terms/${seen.id}`);
  const changed = await call<typeof PATCH>("PATCH", path, { ...fields, version: seen.version });
  hold(address, (terms) => terms.map((one) => (one.id === seen.id ? changed : one)));
}

/** Removes a house's panels. @throws CallFailed */
export async function removeTerms(address: KitAddress, { id, version }: Seen): Promise<void> {
  const path = kitApi(address, `/boards/panel-terms/${id}?version=${version}`);
  await call<typeof DELETE>("DELETE", path);
  hold(address, (terms) => terms.filter((one) => one.id !== id));
}
