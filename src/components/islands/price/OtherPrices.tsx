import { moneyText } from "#src/components/amount-text.ts";
import { take } from "#src/components/islands/run/inputs/entry.ts";
import { priceStrip, type StripPrice } from "#src/costing/price/price-strip.ts";
import type { PriceProps } from "./price-props.ts";
import { countOf, moneyOf, priceText } from "./price-words.ts";

/** Prices beside the chosen one: what each would leave, and after how many sold the run is even. */
export function OtherPrices({ address, context, edition, mayChange }: PriceProps) {
  const { price } = edition;
  const { currency } = context.plan;
  if (price === null) return null;
  const strip = priceStrip(context, { edition: edition.id, channel: null }, price);
  const ask = (text: string) =>
    take(
      { address, row: { kind: "price", id: edition.id }, field: "price", currency, thing: edition.name },
      text,
    );
  return (
    <section aria-labelledby="other-prices" className="min-w-0">
      <h2 id="other-prices" className="type-table mb-1 font-semibold">
        Other prices, and what each would leave per kit
      </h2>
      <ol className="flex overflow-x-auto pb-1 max-tablet:-mr-4">
        {strip.map((one) => (
          <li key={one.price} className="min-w-[88px] flex-1">
            <Other
              one={one}
              currency={currency}
              onAsk={mayChange && !one.asked ? () => ask(one.price) : null}
            />
          </li>
        ))}
      </ol>
    </section>
  );
}

interface OtherProps {
  one: StripPrice;
  currency: string;
  onAsk: (() => void) | null;
}

function Other({ one, currency, onAsk }: OtherProps) {
  const { price, asked, left, evenAfter } = one;
  const even = evenAfter.known ? `even after ${countOf(evenAfter)}` : countOf(evenAfter);
  const look = `block h-full w-full border-t border-b border-l border-t-ink border-b-rule border-l-ink px-2.5 py-3 text-left ${asked ? "bg-petrol text-on-petrol" : ""}`;
  const words = (
    <>
      <span className="block text-[1.1875rem] leading-6 font-semibold">{priceText(price, currency)}</span>
      <span className="type-label block">{moneyOf(left, currency)}</span>
      <span className={`type-label block ${asked ? "" : "text-ink-2"}`}>{even}</span>
    </>
  );
  if (!onAsk)
    return (
      <div className={look} aria-current={asked || undefined}>
        {words}
      </div>
    );
  return (
    <button
      type="button"
      className={`${look} cursor-pointer hover:bg-petrol-wash`}
      aria-label={`Ask ${moneyText(price, currency)}: leaves ${moneyOf(left, currency)}, ${even}`}
      onClick={onAsk}
    >
      {words}
    </button>
  );
}
