import type { Figure } from "#src/costing/figure.ts";
import { scaledText } from "#src/costing/grains.ts";
import { from, money, notKnown, number, type Sheet, type Step, step } from "#src/costing/working-lines.ts";
import type { WorkingAmount } from "#src/costing/working-tree.ts";
import { type ChannelOrder, channelTable } from "./channel-table.ts";
import { type EditionKit, editionKit } from "./edition-kit.ts";
import { type Fraction, nearest, times } from "./fraction.ts";
import type { PreparedChannel } from "./prepared-channel.ts";
import type { PriceContext } from "./price-context.ts";
import { kitsStep, unlessNeeds } from "./working-order.ts";

/** Own work is a cost wherever it is done; said under every sheet that takes it off. */
export const OWN_WORK = "Own work is a cost at its rate, whether it makes a kit or sells it.";

/** Minutes, exact, to 24 places. */
export function minutesOf(minutes: Fraction): WorkingAmount {
  return number(scaledText(nearest(minutes), 24), "min");
}

/** Minutes to sell one order, or that they are not known. */
export function orderMinutes({ minutes, needs }: PreparedChannel): WorkingAmount {
  return unlessNeeds(needs.minutes, number(scaledText(minutes, 24), "min"));
}

/** What one order leaves: comes in, less its kits and the time to sell it. */
export function orderLeftSheet(
  context: PriceContext,
  prepared: PreparedChannel,
  edition: string,
): Sheet | null {
  const { currency } = context.plan;
  const { channel } = prepared;
  const line = channelTable(context, edition).find((one) => one.channel === channel.id);
  if (line === undefined) return null;
  const cash = (amount: Figure | bigint) => money(amount, currency);
  const kit = editionKit(context, edition);
  const takesTime = channel.minutesPerOrder === null || prepared.minutes > 0n;
  return {
    title: `Left of one order: ${channel.name}`,
    steps: [
      step(null, "Cost of one kit", unlessNeeds(kit.needs.cost, cash(nearest(kit.cost))), "8", {
        opens: `edition:${edition}`,
      }),
      ...kitsStep("×", prepared),
      step("=", "Cost of its kits", cash(line.cost), "8"),
      ...(takesTime ? timeSteps(context, prepared, line) : []),
      step(null, "Comes in", cash(line.comesIn), "10", { opens: `order:${channel.id}:${edition}` }),
      step("−", "Cost of its kits", cash(line.cost), "8"),
      ...(takesTime ? [step("−" as const, "Time to sell it", cash(line.timeCost), "7")] : []),
      step("=", "Left", cash(line.left), "10", { result: true }),
    ],
    notes: [OWN_WORK],
    basis: `In ${currency}, after tax, fees and postage`,
  };
}

function timeSteps({ plan }: PriceContext, prepared: PreparedChannel, line: ChannelOrder): Step[] {
  const { ratePerHour } = plan.work;
  const cost = money(line.timeCost, plan.currency);
  const perHour = ratePerHour === null ? cost : money(ratePerHour, plan.currency);
  return [
    step(null, "Minutes to sell an order", orderMinutes(prepared), "7", {
      source: from("price", prepared.channel.id),
    }),
    step("×", "Rate per hour", perHour, "7", { source: from("run") }),
    step("÷", "Minutes in an hour", number("60", "min"), "7"),
    step("=", "Time to sell it", cost, "7"),
  ];
}

/** What an hour of making and selling earns in a channel (section 7). */
export function orderHourSheet(
  context: PriceContext,
  prepared: PreparedChannel,
  edition: string,
): Sheet | null {
  const { currency } = context.plan;
  const { channel } = prepared;
  const line = channelTable(context, edition).find((one) => one.channel === channel.id);
  if (line === undefined) return null;
  const minutes = line.minutes.known ? number(line.minutes.value, "min") : notKnown(line.minutes.needs);
  const kit = editionKit(context, edition);
  const bare = costButWork(context, kit, nearest(times(kit.withoutWork, prepared.kitsPerOrder)));
  return {
    title: `Earned in an hour: ${channel.name}`,
    steps: [
      step(null, "Minutes to make a kit", minutesOf(kit.minutes), "7", { source: from("run") }),
      ...kitsStep("×", prepared),
      step("+", "Minutes to sell the order", orderMinutes(prepared), "7", {
        source: from("price", channel.id),
      }),
      step("=", "Minutes of the order", minutes, "7"),
      step(null, "Cost of a kit but own work", costButWork(context, kit, nearest(kit.withoutWork)), "7"),
      ...kitsStep("×", prepared),
      step("=", "Cost of its kits but own work", bare, "7"),
      step(null, "Comes in", money(line.comesIn, currency), "10", {
        opens: `order:${channel.id}:${edition}`,
      }),
      step("−", "Cost of its kits but own work", bare, "7"),
      step("×", "Minutes in an hour", number("60", "min"), "7"),
      step("÷", "Minutes of the order", minutes, "7"),
      step("=", "Earned in an hour", money(line.perHour, currency), "7", { result: true }),
    ],
    notes: [],
    basis: `In ${currency}, after tax, fees and postage`,
  };
}

/** A cost with own work at nothing, or what it needs. */
export function costButWork({ plan }: PriceContext, kit: EditionKit, cost: bigint): WorkingAmount {
  return unlessNeeds(kit.needs.withoutWork, money(cost, plan.currency));
}
