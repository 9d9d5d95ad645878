import { makeChannel, orderChannels } from "#src/server/channel-changes.ts";
import { planChannel } from "#src/server/plan-channel.ts";
import { route } from "#src/server/route.ts";
import { channelsOf } from "#src/server/store/channel.ts";
import { ChannelEntry, ChannelOrder } from "#src/shapes/channel.ts";

/** The ways to sell a kit, in their order. */
export const GET = route({
  may: "see-money",
  run: ({ db, kit }) => channelsOf(db, kit.id).map(planChannel),
});

/** Adds a way to sell. */
export const POST = route({
  may: "change-price",
  input: ChannelEntry,
  status: 201,
  run: (given) => makeChannel(given, given.input),
});

/** Puts the channels in a new order. */
export const PUT = route({
  may: "change-price",
  input: ChannelOrder,
  run: (given) => orderChannels(given, given.input.channels),
});
