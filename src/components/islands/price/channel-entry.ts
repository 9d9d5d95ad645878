import type { KitAddress } from "#src/components/islands/kit-address.ts";
import type { Entry } from "#src/components/islands/run/inputs/entry.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";

/** Where the terms of a channel go. */
export interface ChannelEntryPlace {
  address: KitAddress;
  channel: PlanChannel;
  currency: string;
}

/** A field of a channel as an entry of the plan. */
export function channelEntry(
  { address, channel, currency }: ChannelEntryPlace,
  field: keyof PlanChannel,
): Entry {
  return { address, row: { kind: "channel", id: channel.id }, field, currency, thing: channel.name };
}

/** What a channel that nobody has described yet begins with: no share, and no terms known. */
export function newChannel(name: string): Omit<PlanChannel, "id"> {
  return {
    name,
    weight: 0,
    editions: null,
    discount: "0",
    ownPrices: [],
    taxRate: null,
    taxStated: "inside",
    feeRate: null,
    feeFixed: null,
    feeOnPostage: true,
    feeOnTax: true,
    postageCharged: null,
    postagePaid: null,
    packingCost: null,
    other: { name: "", amount: "0", sharedOver: 1 },
    minutesPerOrder: null,
    kitsPerOrder: "1",
  };
}

/** A name that no channel has yet: "New channel", then "New channel 2". */
export function freeName(name: string, taken: readonly { name: string }[]): string {
  const has = (one: string) => taken.some((channel) => channel.name === one);
  if (!has(name)) return name;
  let number = 2;
  while (has(`${name} ${number}`)) number += 1;
  return `${name} ${number}`;
}
