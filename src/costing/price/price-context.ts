import { ONE, scaled } from "#src/costing/grains.ts";
import { minorDecimals } from "#src/costing/money.ts";
import type { Plan } from "#src/shapes/plan.ts";
import type { Channel } from "./channel.ts";
import { type PreparedChannel, prepareChannel } from "./prepared-channel.ts";
import { type RunCost, runCost } from "./run-cost.ts";

/** A run ready for pricing: what it costs, and every channel's terms. Prices are those of the plan. */
export interface PriceContext {
  plan: Plan;
  cost: RunCost;
  channels: PreparedChannel[];
  /** Minor unit of the plan's currency, in grains. */
  unit: bigint;
  /** Own work in millionths an hour; null: not decided. */
  hourRate: bigint | null;
}

/**
 * Reads a plan and its channels once, for every figure of the price page. `kits` as in `costRun`; `cost`
 * from `runCost` where it is at hand, since it does not depend on prices or channels.
 *
 * @example channelTable(priceContext(plan, channels), "full")
 */
export function priceContext(
  plan: Plan,
  channels: readonly Channel[],
  kits: number = plan.run.kits,
  cost: RunCost = runCost(plan, kits),
): PriceContext {
  const { ratePerHour } = plan.work;
  return {
    plan,
    cost,
    channels: channels.map(prepareChannel),
    unit: ONE / 10n ** BigInt(minorDecimals(plan.currency)),
    hourRate: ratePerHour === null ? null : scaled(ratePerHour, 6),
  };
}
