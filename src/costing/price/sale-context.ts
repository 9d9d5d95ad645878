import { ONE, scaled } from "#src/costing/grains.ts";
import { minorDecimals } from "#src/costing/money.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { type PreparedChannel, prepareChannel } from "./prepared-channel.ts";

/** What is sold and how: the plan's prices, and every channel's terms read once. */
export interface SaleContext {
  plan: Plan;
  channels: PreparedChannel[];
  /** Minor unit of the plan's currency, in grains. */
  unit: bigint;
  /** Own work in millionths an hour; null: not decided. */
  hourRate: bigint | null;
}

/**
 * Reads the channels of a plan: enough for what a sale keeps.
 *
 * @example soldKit(saleContext(plan), { edition: "full", channel: null }).kept
 */
export function saleContext(plan: Plan): SaleContext {
  const { ratePerHour } = plan.work;
  return {
    plan,
    channels: plan.channels.map(prepareChannel),
    unit: ONE / 10n ** BigInt(minorDecimals(plan.currency)),
    hourRate: ratePerHour === null ? null : scaled(ratePerHour, 6),
  };
}
