import { currencySign } from "#src/components/amount-text.ts";
import { MeasureField } from "#src/components/islands/parts/MeasureField.tsx";
import { MoneyField } from "#src/components/islands/parts/MoneyField.tsx";
import { TextField } from "#src/components/islands/parts/TextField.tsx";
import { take } from "#src/components/islands/run/inputs/entry.ts";
import { AmountEntry, NumberEntry } from "#src/components/islands/run/inputs/fields.tsx";
import { shownMoney } from "#src/components/shown-money.ts";
import { type ChannelEntryPlace, channelEntry } from "./channel-entry.ts";

/** Postage the buyer pays, of an order. */
export function PostageTerms(place: ChannelEntryPlace) {
  const { channel } = place;
  return (
    <AmountEntry
      label="Postage charged"
      row
      off={false}
      mayBeEmpty
      value={channel.postageCharged}
      entry={channelEntry(place, "postageCharged")}
    />
  );
}

/** What sending an order costs. */
export function SendingTerms(place: ChannelEntryPlace) {
  const { channel } = place;
  return (
    <>
      <AmountEntry
        label="Postage paid"
        row
        off={false}
        mayBeEmpty
        value={channel.postagePaid}
        entry={channelEntry(place, "postagePaid")}
      />
      <AmountEntry
        label="Packing of an order"
        row
        off={false}
        mayBeEmpty
        value={channel.packingCost}
        entry={channelEntry(place, "packingCost")}
      />
    </>
  );
}

/** A cost that several orders may share, such as the hire of a stall. */
export function OtherTerms(place: ChannelEntryPlace) {
  const { channel, currency } = place;
  const { other } = channel;
  const give = (change: Partial<typeof other>) => take(channelEntry(place, "other"), { ...other, ...change });
  return (
    <>
      <TextField
        label="What it is"
        row
        maxLength={120}
        placeholder="Stall hire"
        value={other.name}
        onChange={({ currentTarget }) => give({ name: currentTarget.value })}
      />
      <MoneyField
        label="What it costs"
        row
        live
        currency={currencySign(currency)}
        value={shownMoney(other.amount)}
        onMoney={(text) => give({ amount: text === "" ? null : text })}
      />
      <MeasureField
        label="Shared by"
        row
        live
        unit="orders"
        value={String(other.sharedOver)}
        check={(text) => (/^[1-9]\d{0,8}$/.test(text) ? undefined : "Write a whole number of at least 1.")}
        onMeasure={(text) => text !== "" && give({ sharedOver: Number(text) })}
      />
    </>
  );
}

/** Own time to sell and send an order, and how many kits are in one. */
export function TimeTerms(place: ChannelEntryPlace) {
  const { channel } = place;
  return (
    <>
      <NumberEntry
        label="Time for an order"
        row
        off={false}
        mayBeEmpty
        unit="min"
        value={channel.minutesPerOrder}
        entry={channelEntry(place, "minutesPerOrder")}
      />
      <NumberEntry
        label="Kits in an order"
        row
        off={false}
        least={1}
        unit="kits"
        value={channel.kitsPerOrder}
        entry={channelEntry(place, "kitsPerOrder")}
      />
    </>
  );
}
