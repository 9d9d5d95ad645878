import { Decimal } from "decimal.js";
import type { Aim } from "#src/costing/price/aims.ts";
import type { RunCost } from "#src/costing/price/run-cost.ts";
import type { Plan, PlanChannel } from "#src/shapes/plan.ts";

/** Sections 10 and 11 told plainly in decimals, one price at a time: what the quick search is compared with. */

export const D = Decimal.clone({ precision: 120, rounding: Decimal.ROUND_HALF_UP });

export function plainAsked(channel: PlanChannel, edition: string, list: Decimal, places: number): Decimal {
  const own = channel.ownPrices.find((one) => one.edition === edition);
  if (own) return new D(own.price);
  const left = list.times(new D(1).minus(channel.discount));
  if (channel.taxStated === "inside" && new D(channel.discount).isZero()) return list;
  return (channel.taxStated === "on-top" ? left.div(new D(1).plus(channel.taxRate ?? 0)) : left).toDP(places);
}

/** What one order keeps. */
export function plainKept(channel: PlanChannel, asked: Decimal, places: number): Decimal {
  const rate = new D(channel.taxRate ?? 0);
  const inside = channel.taxStated === "inside";
  const taxOf = (sum: Decimal) => (inside ? sum.times(rate).div(rate.plus(1)) : sum.times(rate)).toDP(places);
  const goods = asked.times(channel.kitsPerOrder);
  const charged = goods.plus(channel.postageCharged ?? 0);
  const feeOn = channel.feeOnPostage ? charged : goods;
  const base = inside
    ? channel.feeOnTax
      ? feeOn
      : feeOn.minus(taxOf(feeOn))
    : channel.feeOnTax
      ? feeOn.plus(taxOf(feeOn))
      : feeOn;
  const fee = base
    .times(channel.feeRate ?? 0)
    .plus(channel.feeFixed ?? 0)
    .toDP(places);
  return charged
    .minus(inside ? taxOf(charged) : 0)
    .minus(fee)
    .minus(channel.postagePaid ?? 0)
    .minus(channel.packingCost ?? 0)
    .minus(new D(channel.other.amount ?? 0).div(channel.other.sharedOver));
}

/** Kept, price without tax and minutes of one kit of an edition over the channels that sell it. */
export function plainKit(
  channels: readonly PlanChannel[],
  edition: string,
  price: Decimal,
  places: number,
  only: string | null,
) {
  const selling = channels.filter(
    ({ id, editions, weight }) =>
      (editions === null || editions.includes(edition)) && (only === null ? weight > 0 : id === only),
  );
  const total = selling.reduce((sum, { weight }) => sum + weight, 0);
  let [kept, net, minutes] = [new D(0), new D(0), new D(0)];
  for (const channel of selling) {
    const share = only === null ? new D(channel.weight).div(total) : new D(1);
    const asked = only === null ? plainAsked(channel, edition, price, places) : price;
    kept = kept.plus(plainKept(channel, asked, places).div(channel.kitsPerOrder).times(share));
    const tax = channel.taxStated === "inside" ? new D(channel.taxRate ?? 0) : new D(0);
    net = net.plus(asked.div(tax.plus(1)).times(share));
    minutes = minutes.plus(new D(channel.minutesPerOrder ?? 0).div(channel.kitsPerOrder).times(share));
  }
  return { kept, net, minutes };
}

/** How far an aim is passed at a price; below nothing it is not reached. */
export function plainGap(
  plan: Plan,
  channels: readonly PlanChannel[],
  cost: RunCost,
  scope: { edition: string; channel: string | null },
  aim: Aim,
  price: Decimal,
  places: number,
): Decimal {
  const value = (figure: RunCost["used"]) => new D(figure.known ? figure.value : Number.NaN);
  const rate = new D(plan.work.ratePerHour ?? 0);
  const of = cost.editions.find(({ id }) => id === scope.edition);
  if (of === undefined) throw new Error(`no edition ${scope.edition}`);
  const kit = plainKit(channels, scope.edition, price, places, scope.channel);
  const left = kit.kept.minus(kit.minutes.times(rate).div(60));
  const perKit = value(of.used).div(of.kits);
  if (aim.aim === "next-kit") return left.minus(value(of.nextKit));
  if (aim.aim === "margin") return left.minus(perKit).minus(kit.net.times(aim.rate));
  if (aim.aim === "mark-up") return left.minus(perKit).minus(perKit.times(aim.rate));
  if (aim.aim === "hour") {
    const minutes = kit.minutes.plus(new D(of.minutes).div(of.kits));
    return kit.kept.minus(value(of.withoutWork).div(of.kits)).minus(minutes.times(aim.rate).div(60));
  }
  let profit = left.times(of.kits).minus(value(cost.used));
  for (const other of cost.editions) {
    const list = plan.editions.find(({ id }) => id === other.id)?.price ?? "0";
    if (other.id === scope.edition || other.kits === 0) continue;
    const sold = plainKit(channels, other.id, new D(list), places, null);
    profit = profit.plus(sold.kept.minus(sold.minutes.times(rate).div(60)).times(other.kits));
  }
  if (aim.aim === "run-even") return profit;
  return profit.minus(new D(aim.amount).div(new D(1).minus(aim.taxRate ?? 0)));
}
