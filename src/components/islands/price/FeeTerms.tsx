import { CheckBox } from "#src/components/islands/parts/CheckBox.tsx";
import { take } from "#src/components/islands/run/inputs/entry.ts";
import { AmountEntry, RateEntry } from "#src/components/islands/run/inputs/fields.tsx";
import { leavesNothing } from "#src/costing/price/leaves-nothing.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import { type ChannelEntryPlace, channelEntry } from "./channel-entry.ts";

const NOTHING_LEFT = "Fee and tax together take all of the price.";

function refusal(channel: PlanChannel): string | undefined {
  return leavesNothing(channel) ? NOTHING_LEFT : undefined;
}

/** The rate of the tax, which the fee may be taken on as well. */
export function TaxTerms(place: ChannelEntryPlace) {
  const { channel } = place;
  return (
    <RateEntry
      label="Tax rate"
      row
      off={false}
      mayBeEmpty
      most={999}
      value={channel.taxRate}
      refuse={(taxRate) => refusal({ ...channel, taxRate })}
      entry={channelEntry(place, "taxRate")}
    />
  );
}

/** What the channel takes: so much in a hundred, so much an order, and of which sums. */
export function FeeTerms(place: ChannelEntryPlace) {
  const { channel } = place;
  const onTax = { ...channel, feeOnTax: !channel.feeOnTax };
  return (
    <>
      <RateEntry
        label="Fee rate"
        row
        off={false}
        mayBeEmpty
        below={100}
        value={channel.feeRate}
        refuse={(feeRate) => refusal({ ...channel, feeRate })}
        entry={channelEntry(place, "feeRate")}
      />
      <AmountEntry
        label="Fee per order"
        row
        off={false}
        mayBeEmpty
        value={channel.feeFixed}
        entry={channelEntry(place, "feeFixed")}
      />
      <CheckBox
        label="Fee on postage too"
        checked={channel.feeOnPostage}
        onChange={({ currentTarget }) => take(channelEntry(place, "feeOnPostage"), currentTarget.checked)}
      />
      <CheckBox
        label="Fee on tax too"
        checked={channel.feeOnTax}
        disabled={leavesNothing(onTax)}
        hint={leavesNothing(onTax) ? NOTHING_LEFT : undefined}
        onChange={({ currentTarget }) => take(channelEntry(place, "feeOnTax"), currentTarget.checked)}
      />
    </>
  );
}
