import type { ChannelEntry } from "#src/shapes/channel.ts";
import type { PlanChannel } from "#src/shapes/plan.ts";
import type { ChannelFields, ChannelWithPrices } from "./store/channel.ts";

/** A channel as the plan has it. */
export function planChannel({ channel, ownPrices }: ChannelWithPrices): PlanChannel {
  const { otherName, otherAmount, otherSharedOver, workshopId, kitId, position, version, ...same } = channel;
  return {
    ...same,
    ownPrices,
    other: { name: otherName, amount: otherAmount, sharedOver: otherSharedOver },
  };
}

/** Fields of a channel as its row has them; its own prices are rows of their own. */
export function channelFields({
  ownPrices: _,
  other,
  ...same
}: Partial<Omit<ChannelEntry, "position">>): ChannelFields {
  if (!other) return same;
  return { ...same, otherName: other.name, otherAmount: other.amount, otherSharedOver: other.sharedOver };
}
