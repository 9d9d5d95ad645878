import { z } from "zod";
import { Name, RowId, Version } from "./field.ts";
import { CHANNELS_MOST } from "./limits.ts";
import { PlanChannel } from "./plan.ts";

const Fields = PlanChannel.omit({ id: true }).extend({ name: Name });

/** A new channel; without a position it comes last. */
export const ChannelEntry = Fields.extend({ position: z.int().min(0).max(1_000_000).optional() });
export type ChannelEntry = z.infer<typeof ChannelEntry>;

export const ChannelChange = Fields.partial().extend({ version: Version });
export type ChannelChange = z.infer<typeof ChannelChange>;

/** Every channel of the kit, in the order they shall have. */
export const ChannelOrder = z.strictObject({ channels: z.array(RowId).min(1).max(CHANNELS_MOST) });
