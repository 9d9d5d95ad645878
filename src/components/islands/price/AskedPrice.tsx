import { currencySign } from "#src/components/amount-text.ts";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { take } from "#src/components/islands/run/inputs/entry.ts";
import { shownMoney } from "#src/components/shown-money.ts";
import type { PriceProps } from "./price-props.ts";
import { listed } from "./price-words.ts";

/** First names of those who set prices, and of those who only see them. */
export interface WhoPrices {
  setters: readonly string[];
  seers: readonly string[];
}

/** "Tom sets the price. Ines and Ruth see it." */
export function whoWords({ setters, seers }: WhoPrices): string {
  const set = `${listed(setters)} ${setters.length === 1 ? "sets" : "set"} the price.`;
  return seers.length === 0 ? set : `${set} ${listed(seers)} ${seers.length === 1 ? "sees" : "see"} it.`;
}

/** The list price of the edition in view, large. */
export function AskedPrice({ address, context, edition, mayChange, who }: PriceProps & { who: WhoPrices }) {
  const { plan } = context;
  const entry = {
    address,
    row: { kind: "price", id: edition.id } as const,
    field: "price",
    currency: plan.currency,
    thing: edition.name,
  };
  const several = plan.editions.length > 1;
  return (
    <MoneyField
      key={edition.id}
      id="list-price"
      label={several ? `List price of ${edition.name}, with tax` : "List price, with tax"}
      large
      live
      currency={currencySign(plan.currency)}
      value={shownMoney(edition.price)}
      off={!mayChange}
      hint={whoWords(who)}
      onMoney={(text) => take(entry, text === "" ? null : text)}
      className="w-[300px] max-w-full"
    />
  );
}
