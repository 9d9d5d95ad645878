import type { FigureProps } from "#src/components/islands/parts/Figure.tsx";
import type { ConsideredOffer } from "#src/costing/run-result.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import { type ChoiceHead, ChoiceTable } from "./ChoiceTable.tsx";
import { OfferRow } from "./OfferRow.tsx";

/** An offer with its supplier and what the reckoning makes of it. */
export interface ReckonedOffer {
  offer: OfferView;
  supplier: SupplierView | undefined;
  considered: ConsideredOffer;
}

export interface OfferTableProps {
  caption: string;
  rows: readonly ReckonedOffer[];
  /** The pinned offer; null: the cheapest, worked out. */
  pinned: string | null;
  today: string;
  canChoose: boolean;
  canChange: boolean;
  supplierHref: (supplier: string) => string;
  /** What the run is reckoned in, and what other currencies are worth in it. */
  reporting: string;
  rateOf: (currency: string) => string | null;
  /** Opens the working of what an offer comes to. */
  workingOf: (considered: ConsideredOffer) => Pick<FigureProps, "onOpen" | "open" | "controls">;
  onPin: (offer: string | null) => void;
  onEdit: (offer: OfferView) => void;
}

const HEADS: readonly ChoiceHead[] = [
  { head: "Supplier" },
  { head: "Price breaks", wide: true },
  { head: "Buy", number: true },
  { head: "You pay", number: true },
  { head: "In stock", number: true, wide: true },
  { head: "Lead time", wide: true },
  { head: "Seen", wide: true },
];

/** Every offer for a part, best first, with the choice among them. */
export function OfferTable(props: OfferTableProps) {
  const { caption, rows, pinned, canChoose, onPin } = props;
  const cheapest = {
    name: "pinned-offer",
    id: "pinned-none",
    checked: pinned === null,
    onChoose: () => onPin(null),
  };
  return (
    <ChoiceTable caption={caption} heads={HEADS} cheapest={canChoose ? cheapest : undefined}>
      {rows.map((row) => (
        <OfferRow key={row.offer.id} row={row} {...props} />
      ))}
    </ChoiceTable>
  );
}
