import { dropChannel, setChannel } from "#src/server/channel-changes.ts";
import { route } from "#src/server/route.ts";
import { ChannelChange } from "#src/shapes/channel.ts";
import { RemovalQuery } from "#src/shapes/field.ts";

/** Changes what a channel asks and takes. */
export const PATCH = route({
  may: "change-price",
  input: ChannelChange,
  run: (given) => setChannel(given, given.params.channel ?? "", given.input),
});

/** Removes a channel and hands it back. */
export const DELETE = route({
  may: "change-price",
  query: RemovalQuery,
  run: (given) => dropChannel(given, given.params.channel ?? "", given.query.version),
});
