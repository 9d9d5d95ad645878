import { useMemo, useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import { CallFailed } from "#src/components/islands/call.ts";
import type { PastedRow } from "#src/components/islands/cells/cell-column.ts";
import { Sheet } from "#src/components/islands/cells/Sheet.tsx";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { ErrorBox } from "#src/components/islands/parts/ErrorBox.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import type { KitOffers } from "#src/server/kit-offers.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { KitSupply } from "./kit-supply.ts";
import { type NewOfferFault, nextOffer, readNewOffers, refusedOffer } from "./new-offers.ts";
import { offerColumns } from "./offer-columns.ts";
import { offersSheet, saveBatch } from "./offers-store.ts";

interface EveryOfferProps {
  address: KitAddress;
  supply: KitSupply;
  today: string;
  canChange: boolean;
  styleNonce: string;
}

/** Offers in the order of the list, then by supplier. */
function inListOrder({ parts, suppliers, offers }: KitOffers): OfferView[] {
  const placeOf = new Map(parts.map(({ id }, place) => [id, place]));
  const nameOf = new Map(suppliers.map(({ id, name }) => [id, name]));
  return [...offers].sort(
    (a, b) =>
      (placeOf.get(a.partId) ?? 0) - (placeOf.get(b.partId) ?? 0) ||
      (nameOf.get(a.supplierId) ?? "").localeCompare(nameOf.get(b.supplierId) ?? "") ||
      a.id.localeCompare(b.id),
  );
}

/** Every offer in one sheet, for editing and pasting; a block pasted below the last row adds offers. */
export function EveryOffer({ address, supply, today, canChange, styleNonce }: EveryOfferProps) {
  const { parts, suppliers, offers } = supply;
  // biome-ignore lint/correctness/useExhaustiveDependencies: the links depend on the address alone.
  const columns = useMemo(
    () => offerColumns({ parts, suppliers, offers }, supply.partHref),
    [parts, suppliers, offers, address.kit],
  );
  const store = useMemo(() => offersSheet(address), [address]);
  const rows = useMemo(() => inListOrder({ parts, suppliers, offers }), [parts, suppliers, offers]);
  const [faults, setFaults] = useState<readonly NewOfferFault[]>([]);
  const nameOf = ({ partId, supplierId }: OfferView) =>
    `${parts.find(({ id }) => id === partId)?.name ?? "A part"} from ${supply.nameOf(supplierId)}`;
  const next = useMemo(() => {
    async function onRows(pasted: PastedRow[]) {
      const { add, faults: found } = readNewOffers(pasted, { parts, suppliers, offers }, columns, today);
      setFaults(found);
      if (found.length > 0 || add.length === 0) return;
      try {
        const { added } = await saveBatch(address, { add });
        showToast({
          text: added.length === 1 ? "One offer added." : `${countText(added.length)} offers added.`,
          action: { label: "Undo", run: () => void takeBack(address, added) },
        });
      } catch (error) {
        if (!(error instanceof CallFailed)) throw error;
        const { errors, title, detail } = error.problem;
        if (errors) setFaults(errors.map((one) => refusedOffer(one, pasted, columns)));
        else showToast({ kind: "fault", text: `${title} ${detail}` });
      }
    }
    return {
      row: nextOffer(),
      words: "Paste new offers here",
      onRows: (all: PastedRow[]) => void onRows(all),
    };
  }, [address, columns, offers, parts, suppliers, today]);
  return (
    <Section
      title="Every offer"
      aside="a block copied from a spreadsheet can be pasted into the cells, or below them as new offers"
      id="every-offer"
    >
      {offers.length === 0 && !canChange ? (
        <p className="type-note py-3">No offers yet.</p>
      ) : (
        <Sheet
          label="Every offer"
          rows={rows}
          canEdit={canChange}
          next={canChange ? next : undefined}
          {...{ columns, nameOf, store, styleNonce }}
        />
      )}
      <NotAdded
        faults={faults}
        headOf={(key) => columns.find((one) => one.key === key)?.head ?? ""}
        onDrop={() => setFaults([])}
      />
    </Section>
  );
}

/** Takes added offers out again. */
async function takeBack(address: KitAddress, added: readonly OfferView[]): Promise<void> {
  try {
    await saveBatch(address, { remove: added.map(({ id, version }) => ({ id, version })) });
  } catch (error) {
    if (!(error instanceof CallFailed)) throw error;
    showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
  }
}

interface NotAddedProps {
  faults: readonly NewOfferFault[];
  headOf: (column: string) => string;
  onDrop: () => void;
}

/** Why nothing of a pasted block was added, cell by cell. */
function NotAdded({ faults, headOf, onDrop }: NotAddedProps) {
  if (faults.length === 0) return null;
  return (
    <div className="mt-4">
      <ErrorBox
        title={`No offer is added: ${faults.length === 1 ? "one cell is" : `${faults.length} cells are`} not right`}
        alert
        causes={faults.map(({ row, column, entry, sentence }) => ({
          key: `${row} ${column}`,
          place: `Row ${row}`,
          what: headOf(column),
          reason: sentence,
          detail: entry === "" ? "It is empty." : `It says “${entry}”.`,
        }))}
      >
        <p className="type-note">
          Rows are counted in what was pasted. Put them right in the spreadsheet and paste the block again.{" "}
          <QuietButton onClick={onDrop}>Close</QuietButton>
        </p>
      </ErrorBox>
    </div>
  );
}
