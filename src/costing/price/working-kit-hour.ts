import { scaledText } from "#src/costing/grains.ts";
import { from, money, number, type Sheet, type Step, step } from "#src/costing/working-lines.ts";
import { editionKit } from "./edition-kit.ts";
import { fraction, nearest, over, plus } from "./fraction.ts";
import type { PriceContext } from "./price-context.ts";
import { yieldsAt } from "./price-yields.ts";
import { type SoldKit, soldKit } from "./sold-kit.ts";
import { kitsStep, unlessNeeds } from "./working-order.ts";
import { costButWork, minutesOf, orderMinutes } from "./working-order-left.ts";
import { overChannels } from "./working-over-channels.ts";

/** What an hour of making and selling earns over all channels (section 7). */
export function kitHourSheet(context: PriceContext, edition: string): Sheet {
  const { currency } = context.plan;
  const sold = soldKit(context, { edition, channel: null });
  const kit = editionKit(context, edition);
  const { kept, perHour } = yieldsAt(context, sold.sale.scope);
  const minutes = unlessNeeds(sold.needs.minutes, minutesOf(plus(kit.minutes, sold.minutes)));
  return {
    title: "Earned in an hour, over all channels",
    steps: [
      ...sellingSteps(sold),
      step("+", "Minutes to make a kit", minutesOf(kit.minutes), "7", { source: from("run") }),
      step("=", "Minutes of a kit", minutes, "7"),
      step(null, "One kit brings", money(kept, currency), "10", { opens: `kit-kept:${edition}` }),
      step("−", "Cost of a kit but own work", costButWork(context, kit, nearest(kit.withoutWork)), "7"),
      step("×", "Minutes in an hour", number("60", "min"), "7"),
      step("÷", "Minutes of a kit", minutes, "7"),
      step("=", "Earned in an hour", money(perHour, currency), "7", { result: true }),
    ],
    notes: [],
    basis: `In ${currency}, after tax, fees and postage`,
  };
}

function sellingSteps({ sale, needs }: SoldKit): Step[] {
  const minutes = (value: bigint) => unlessNeeds(needs.minutes, number(scaledText(value, 24), "min"));
  return overChannels(sale, minutes, (prepared) => ({
    perKit: over(fraction(prepared.minutes), prepared.kitsPerOrder),
    label: `Minutes, part of ${prepared.channel.name}`,
    start: [
      step(null, `Minutes to sell an order, ${prepared.channel.name}`, orderMinutes(prepared), "7", {
        source: from("price", prepared.channel.id),
      }),
      ...kitsStep("÷", prepared),
    ],
  }));
}
