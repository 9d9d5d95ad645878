import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import { spanText } from "#src/components/day-text.ts";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import { Figure, type FigureProps } from "#src/components/islands/parts/Figure.tsx";
import { QuietButton } from "#src/components/islands/parts/QuietButton.tsx";
import { RadioDot } from "#src/components/islands/parts/RadioGroup.tsx";
import { CELL, HEAD_CELL, HEAD_ROW, NUMBER, rowLook, TABLE } from "#src/components/table-look.ts";
import { exact } from "#src/costing/decimal.ts";
import type { ConsideredOffer } from "#src/costing/run-result.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import { offerMark, seenText } from "./offer-words.ts";

/** An offer with its supplier and what the reckoning makes of it. */
export interface OfferRow {
  offer: OfferView;
  supplier: SupplierView | undefined;
  considered: ConsideredOffer;
}

export interface OfferTableProps {
  caption: string;
  rows: readonly OfferRow[];
  /** The pinned offer; null: the cheapest, worked out. */
  pinned: string | null;
  today: string;
  canChoose: boolean;
  canChange: boolean;
  supplierHref: (supplier: string) => string;
  /** What the run is reckoned in, and what other currencies are worth in it. */
  reporting: string;
  rateOf: (currency: string) => string | null;
  /** Opens the working of the part. */
  working: Pick<FigureProps, "onOpen" | "open" | "controls">;
  onPin: (offer: string | null) => void;
  onEdit: (offer: OfferView) => void;
}

const WIDE = "max-tablet:hidden";

/** Every offer for a part, best first, with the choice among them. */
export function OfferTable(props: OfferTableProps) {
  const { caption, rows, pinned, canChoose, canChange, onPin } = props;
  return (
    <table className={TABLE}>
      <caption className="heard-only">{caption}</caption>
      <thead>
        <tr className={HEAD_ROW}>
          <th scope="col" className={HEAD_CELL}>
            Supplier
          </th>
          <th scope="col" className={`${HEAD_CELL} ${WIDE}`}>
            Price breaks
          </th>
          <th scope="col" className={`${HEAD_CELL} ${NUMBER}`}>
            Buy
          </th>
          <th scope="col" className={`${HEAD_CELL} ${NUMBER}`}>
            You pay
          </th>
          <th scope="col" className={`${HEAD_CELL} ${NUMBER} ${WIDE}`}>
            In stock
          </th>
          <th scope="col" className={`${HEAD_CELL} ${WIDE}`}>
            Lead time
          </th>
          <th scope="col" className={`${HEAD_CELL} ${WIDE}`}>
            Seen
          </th>
          <th scope="col" className={`${HEAD_CELL} ${WIDE}`}>
            <span className="heard-only">State</span>
          </th>
          {canChange && (
            <th scope="col" className={`${HEAD_CELL} ${WIDE}`}>
              <span className="heard-only">Change</span>
            </th>
          )}
        </tr>
      </thead>
      <tbody>
        {canChoose && (
          <tr className={rowLook("ordinary")}>
            <td colSpan={canChange ? 9 : 8} className={CELL}>
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
          <Row key={row.offer.id} row={row} {...props} />
        ))}
      </tbody>
    </table>
  );
}

function Row({ row, ...props }: OfferTableProps & { row: OfferRow }) {
  const { offer, supplier, considered } = row;
  const { today, canChange, onEdit } = props;
  const mark = offerMark(offer, considered, today);
  const lead = offer.leadTimeDays ?? supplier?.leadTimeDays ?? null;
  const name = `${supplier?.name ?? "Nobody"} ${offer.orderCode}`.trim();
  const state = (
    <Chip kind={mark.kind} className="align-middle">
      {mark.word}
    </Chip>
  );
  const change = (
    <QuietButton onClick={() => onEdit(offer)} aria-label={`Change the offer of ${name}`}>
      Change
    </QuietButton>
  );
  return (
    <tr data-chosen={considered.chosen || undefined} className={rowLook("two-lines", considered.chosen)}>
      <th scope="row" className={`${CELL} font-normal`}>
        <Who row={row} name={name} {...props} />
        <span className="mt-1 flex flex-wrap items-center gap-x-4 pl-[34px] tablet:hidden">
          {state}
          {canChange && change}
        </span>
      </th>
      <td className={`${CELL} ${WIDE}`}>
        <Breaks offer={offer} reached={considered.quantity} />
      </td>
      <td className={`${CELL} ${NUMBER} font-semibold`}>
        {considered.quantity === null ? "" : countText(considered.quantity)}
      </td>
      <td className={`${CELL} ${NUMBER}`}>
        <Pays row={row} {...props} />
      </td>
      <td className={`${CELL} ${NUMBER} ${WIDE}`}>
        {offer.stockShown === null ? (
          <span className="text-ink-2">not shown</span>
        ) : (
          countText(offer.stockShown)
        )}
      </td>
      <td className={`${CELL} ${WIDE}`}>{lead === null ? "not known" : spanText(lead)}</td>
      <td className={`${CELL} text-ink-2 ${WIDE}`}>{seenText(offer, today)}</td>
      <td className={`${CELL} ${WIDE}`}>{state}</td>
      {canChange && <td className={`${CELL} ${WIDE}`}>{change}</td>}
    </tr>
  );
}

/** In the offer's currency, and below it in the run's where that is another. The chosen one opens its working. */
function Pays({
  row: { offer, considered },
  reporting,
  rateOf,
  working,
}: OfferTableProps & { row: OfferRow }) {
  const { extended, chosen } = considered;
  if (extended === null) return null;
  const rate = offer.currency === reporting ? null : rateOf(offer.currency);
  return (
    <>
      <Figure label="You pay" value={moneyText(extended, offer.currency)} {...(chosen ? working : {})} />
      {rate !== null && (
        <span className="block text-ink-2 type-label">
          {moneyText(exact(extended).times(rate).toFixed(), reporting)}
        </span>
      )}
    </>
  );
}

function Who({
  row: { offer, supplier, considered },
  name,
  pinned,
  canChoose,
  onPin,
  supplierHref,
}: OfferTableProps & { row: OfferRow; name: string }) {
  const words = (
    <span className="min-w-0">
      <span className={`block ${considered.chosen ? "font-semibold" : ""}`}>
        {supplier ? (
          <a className="text-ink no-underline hover:underline" href={supplierHref(supplier.id)}>
            {supplier.name}
          </a>
        ) : (
          "No supplier"
        )}
      </span>
      <span className="block wrap-anywhere text-ink-2 type-label">{offer.orderCode || "no order code"}</span>
    </span>
  );
  if (!canChoose) return words;
  return (
    <span className="flex items-center gap-3">
      <RadioDot
        name="pinned-offer"
        checked={pinned === offer.id}
        onChange={() => onPin(offer.id)}
        aria-label={`Always ${name}`}
        className={pinned === null && considered.chosen ? "border-petrol" : ""}
      />
      {words}
    </span>
  );
}

/** The ladder in small: the rung that the order reaches stands out. */
function Breaks({ offer, reached }: { offer: OfferView; reached: number | null }) {
  if (offer.breaks.length === 0) return <span className="text-ink-2">none written down</span>;
  const at =
    offer.priceModel === "lots"
      ? undefined
      : offer.breaks.findLast(({ quantity }) => reached !== null && quantity <= reached);
  return (
    <span className="flex flex-wrap gap-y-1">
      {offer.breaks.map((rung) => (
        <span
          key={rung.quantity}
          className={`border-l border-rule px-3 first:border-l-0 first:pl-0 ${rung === at ? "font-semibold text-petrol" : ""}`}
        >
          <span className={`block type-label ${rung === at ? "" : "text-ink-2"}`}>
            {countText(rung.quantity)}
          </span>
          <span className="block type-label">
            {offer.priceModel === "lots"
              ? moneyText(rung.price, offer.currency)
              : unitPriceText(rung.price, offer.currency)}
          </span>
        </span>
      ))}
    </span>
  );
}
