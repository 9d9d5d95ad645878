import { currencySign } from "#src/components/amount-text.ts";
import { ChoiceField } from "#src/components/islands/parts/ChoiceField.tsx";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { take } from "#src/components/islands/run/inputs/entry.ts";
import { fromPercent, toPercent } from "#src/components/percent.ts";
import { shownMoney } from "#src/components/shown-money.ts";
import type { PlanEdition } from "#src/shapes/plan.ts";
import { type ChannelEntryPlace, channelEntry } from "./channel-entry.ts";
import { withOwnPrice } from "./with-own-price.ts";

/** What a channel asks: a price of its own, or the list price with so much off or on. */
export function PriceTerms(place: ChannelEntryPlace & { edition: PlanEdition }) {
  const { channel, edition, currency } = place;
  const own = channel.ownPrices.find((one) => one.edition === edition.id)?.price;
  return (
    <>
      <MoneyField
        key={edition.id}
        label="Own price"
        row
        live
        currency={currencySign(currency)}
        value={shownMoney(own ?? null)}
        hint="Empty: it follows the list."
        onMoney={(text) =>
          take(
            channelEntry(place, "ownPrices"),
            withOwnPrice(channel.ownPrices, edition.id, text === "" ? null : text),
          )
        }
      />
      {own === undefined && <DiscountTerms {...place} />}
      <ChoiceField
        label="Prices are stated"
        row
        choices={[
          { value: "inside", label: "with tax" },
          { value: "on-top", label: "without tax" },
        ]}
        value={channel.taxStated}
        onChange={(change) => take(channelEntry(place, "taxStated"), change.currentTarget.value)}
      />
    </>
  );
}

/** So much off the list price, or above it. */
function DiscountTerms(place: ChannelEntryPlace) {
  const { channel } = place;
  const above = channel.discount.startsWith("-");
  const size = above ? channel.discount.slice(1) : channel.discount;
  const give = (amount: string, isAbove: boolean) =>
    take(channelEntry(place, "discount"), isAbove && /[1-9]/.test(amount) ? `-${amount}` : amount);
  const most = above ? 999 : 100;
  return (
    <>
      <MeasureField
        label="Against the list"
        row
        live
        unit="%"
        value={toPercent(size)}
        check={(percent) => {
          if (!/^\d+(\.\d{1,4})?$/.test(percent)) return "Write at most four decimals.";
          if (above ? Number(percent) > most : Number(percent) >= most)
            return above ? `Write at most ${most} %.` : `Write less than ${most} %.`;
          return undefined;
        }}
        onMeasure={(percent) => give(percent === "" ? "0" : fromPercent(percent), above)}
      />
      <ChoiceField
        label="Off or above the list"
        labelHidden
        row
        choices={[
          { value: "off", label: "off the list" },
          { value: "above", label: "above the list" },
        ]}
        value={above ? "above" : "off"}
        disabled={!/[1-9]/.test(size)}
        onChange={(change) => give(size, change.currentTarget.value === "above")}
      />
    </>
  );
}
