import { money, notKnown, rate, type Sheet, type Step, step } from "#src/costing/working-lines.ts";
import { editionKit } from "./edition-kit.ts";
import { askedIn, editionSale, netOf } from "./edition-sale.ts";
import { nearest, over } from "./fraction.ts";
import { orderOf } from "./order.ts";
import type { PriceContext } from "./price-context.ts";
import { yieldsAt } from "./price-yields.ts";
import { priceNow, soldKit } from "./sold-kit.ts";
import { kitsStep, onePlusTax, unlessNeeds } from "./working-order.ts";
import { OWN_WORK } from "./working-order-left.ts";
import { overChannels } from "./working-over-channels.ts";

/** The basis of every sheet here. */
function basisIn({ plan }: PriceContext): string {
  return `In ${plan.currency}, after tax, fees and postage`;
}

/** What is kept of one kit over all channels (section 10). */
export function kitKeptSheet(context: PriceContext, edition: string): Sheet {
  const { currency } = context.plan;
  const { kept } = yieldsAt(context, { edition, channel: null });
  return {
    title: "Kept of one kit, over all channels",
    steps: [
      ...(kept.known ? keptSteps(context, edition) : []),
      step(kept.known ? "=" : null, "Kept of one kit", money(kept, currency), "10", { result: true }),
    ],
    notes: ["Channels count by their share, exactly."],
    basis: basisIn(context),
  };
}

function keptSteps(context: PriceContext, edition: string): Step[] {
  const { plan, channels, unit } = context;
  const sale = editionSale(channels, { edition, channel: null });
  const price = priceNow(context, sale.scope);
  const cash = (value: bigint) => money(value, plan.currency);
  return overChannels(sale, cash, (prepared) => {
    const { channel, kitsPerOrder } = prepared;
    const { kept } = orderOf(prepared, askedIn(sale, prepared, price, unit) ?? 0n, unit);
    const opens = `order:${channel.id}:${edition}` as const;
    return {
      perKit: over(kept, kitsPerOrder),
      label: `Part of ${channel.name}`,
      start: [
        step(null, `Comes in from an order, ${channel.name}`, cash(nearest(kept)), "10", { opens }),
        ...kitsStep("÷", prepared),
      ],
    };
  });
}

/** What one kit brings: kept less the time to sell it. */
export function kitBringsSheet(context: PriceContext, edition: string): Sheet {
  const { currency } = context.plan;
  const yields = yieldsAt(context, { edition, channel: null });
  return {
    title: "What one kit brings, over all channels",
    steps: [
      step(null, "Kept of one kit", money(yields.kept, currency), "10", { opens: `kit-kept:${edition}` }),
      step("−", "Time to sell it", money(yields.timeCost, currency), "7"),
      step("=", "One kit brings", money(yields.brings, currency), "10", { result: true }),
    ],
    notes: [OWN_WORK],
    basis: basisIn(context),
  };
}

/** What one kit leaves over all channels. */
export function kitLeftSheet(context: PriceContext, edition: string): Sheet {
  const { currency } = context.plan;
  const yields = yieldsAt(context, { edition, channel: null });
  return {
    title: "Left of one kit, over all channels",
    steps: [
      step(null, "Kept of one kit", money(yields.kept, currency), "10", { opens: `kit-kept:${edition}` }),
      step("−", "Cost of one kit", money(yields.cost, currency), "8", { opens: `edition:${edition}` }),
      step("−", "Time to sell it", money(yields.timeCost, currency), "7"),
      step("=", "Left", money(yields.left, currency), "10", { result: true }),
    ],
    notes: [OWN_WORK],
    basis: basisIn(context),
  };
}

/** Left over price without tax (section 10). */
export function kitMarginSheet(context: PriceContext, edition: string): Sheet {
  const { currency } = context.plan;
  const { net, left, margin } = yieldsAt(context, { edition, channel: null });
  return {
    title: "Margin",
    steps: [
      ...(net.known ? netSteps(context, edition) : []),
      step(null, "Left of one kit", money(left, currency), "10", { opens: `kit-left:${edition}` }),
      step("÷", "Price without tax", money(net, currency), "10"),
      step("=", "Margin", margin.known ? rate(margin.value) : notKnown(margin.needs), "10", { result: true }),
    ],
    notes: ["A margin is measured on the price without tax, a mark-up on the cost."],
    basis: basisIn(context),
  };
}

function netSteps(context: PriceContext, edition: string): Step[] {
  const { plan, channels, unit } = context;
  const sale = editionSale(channels, { edition, channel: null });
  const price = priceNow(context, sale.scope);
  const cash = (value: bigint) => money(value, plan.currency);
  const steps = overChannels(sale, cash, (prepared) => {
    const asked = askedIn(sale, prepared, price, unit) ?? 0n;
    return {
      perKit: netOf(prepared, asked),
      label: `Part of ${prepared.channel.name}, without tax`,
      start: [
        step(null, `Price asked, ${prepared.channel.name}`, cash(asked), "10"),
        ...(prepared.taxOnTop
          ? []
          : [step("÷" as const, "One and the tax rate", onePlusTax(prepared), "10")]),
      ],
    };
  });
  const { net } = soldKit(context, sale.scope);
  return [...steps, step("=", "Price without tax", cash(nearest(net)), "10")];
}

/** Left over cost (section 10). */
export function kitMarkUpSheet(context: PriceContext, edition: string): Sheet {
  const { currency } = context.plan;
  const { left, cost, markUp } = yieldsAt(context, { edition, channel: null });
  return {
    title: "Mark-up",
    steps: [
      step(null, "Left of one kit", money(left, currency), "10", { opens: `kit-left:${edition}` }),
      step("÷", "Cost of one kit", money(cost, currency), "10", { opens: `edition:${edition}` }),
      step("=", "Mark-up", markUp.known ? rate(markUp.value) : notKnown(markUp.needs), "10", {
        result: true,
      }),
    ],
    notes: ["A margin is measured on the price without tax, a mark-up on the cost."],
    basis: basisIn(context),
  };
}

/** What the next kit of an edition leaves (sections 9 and 10). */
export function kitNextSheet(context: PriceContext, edition: string): Sheet {
  const { currency } = context.plan;
  const { nextKit, needs } = editionKit(context, edition);
  const yields = yieldsAt(context, { edition, channel: null });
  const cost = unlessNeeds(needs.nextKit, money(nearest(nextKit), currency));
  return {
    title: "Left of the next kit",
    steps: [
      step(null, "Kept of one kit", money(yields.kept, currency), "10", { opens: `kit-kept:${edition}` }),
      step("−", "What one more costs the run", cost, "9"),
      step("−", "Time to sell it", money(yields.timeCost, currency), "7"),
      step("=", "Left", money(yields.nextKit, currency), "10", { result: true }),
    ],
    notes: ["A run of one more is costed afresh, with its own orders.", OWN_WORK],
    basis: basisIn(context),
  };
}
