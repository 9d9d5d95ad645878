import type { FigureProps } from "#src/components/islands/parts/Figure.tsx";
import { RadioDot } from "#src/components/islands/parts/RadioGroup.tsx";
import { CELL, HEAD_CELL, HEAD_ROW, NUMBER, rowLook, TABLE } from "#src/components/table-look.ts";
import type { ConsideredOffer } from "#src/costing/run-result.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
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

const WIDE = "max-tablet:hidden";

const HEADS = [
  { head: "Supplier", look: "" },
  { head: "Price breaks", look: WIDE },
  { head: "Buy", look: NUMBER },
  { head: "You pay", look: NUMBER },
  { head: "In stock", look: `${NUMBER} ${WIDE}` },
  { head: "Lead time", look: `whitespace-nowrap ${WIDE}` },
  { head: "Seen", look: WIDE },
] as const;

/** Every offer for a part, best first, with the choice among them. */
export function OfferTable(props: OfferTableProps) {
  const { caption, rows, pinned, canChoose, onPin } = props;
  return (
    <table className={TABLE}>
      <caption className="heard-only">{caption}</caption>
      <thead>
        <tr className={HEAD_ROW}>
          {HEADS.map(({ head, look }) => (
            <th key={head} scope="col" className={`${HEAD_CELL} ${look}`}>
              {head}
            </th>
          ))}
          <th scope="col" className={`${HEAD_CELL} ${WIDE}`}>
            <span className="heard-only">State</span>
          </th>
        </tr>
      </thead>
      <tbody>
        {canChoose && (
          <tr className={rowLook("ordinary")}>
            <td colSpan={HEADS.length + 1} className={CELL}>
              <label htmlFor="pinned-none" className="inline-flex min-h-10 items-center gap-3">
                <RadioDot
                  id="pinned-none"
                  name="pinned-offer"
                  checked={pinned === null}
                  onChange={() => onPin(null)}
                />
                The cheapest, worked out for every run
              </label>
            </td>
          </tr>
        )}
        {rows.map((row) => (
          <OfferRow key={row.offer.id} row={row} {...props} />
        ))}
      </tbody>
    </table>
  );
}
