import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import type { OfferView } from "#src/server/offer-changes.ts";

/** The ladder in small, four rungs to a line: the rung that the order reaches stands out. */
export function OfferBreaks({ offer, reached }: { offer: OfferView; reached: number | null }) {
  if (offer.breaks.length === 0) return <span className="text-ink-2">none written down</span>;
  const lots = offer.priceModel === "lots";
  const at = lots
    ? undefined
    : offer.breaks.findLast(({ quantity }) => reached !== null && quantity <= reached);
  return (
    <span className="grid w-max grid-cols-[repeat(4,auto)] gap-y-1">
      {offer.breaks.map((rung) => (
        <span
          key={rung.quantity}
          className={`border-l border-rule px-2.5 nth-[4n+1]:border-l-0 nth-[4n+1]:pl-0 ${rung === at ? "font-semibold text-petrol" : ""}`}
        >
          <span className={`block type-label ${rung === at ? "" : "text-ink-2"}`}>
            {countText(rung.quantity)}
          </span>
          <span className="block type-label">
            {lots ? moneyText(rung.price, offer.currency) : unitPriceText(rung.price, offer.currency)}
          </span>
        </span>
      ))}
    </span>
  );
}
