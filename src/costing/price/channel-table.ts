import type { Figure } from "#src/costing/figure.ts";
import { wholeFigure } from "#src/costing/figure-of.ts";
import { ONE } from "#src/costing/grains.ts";
import type { Need } from "#src/costing/problem.ts";
import { joinNeeds, need } from "#src/costing/run-needs.ts";
import { splitKits } from "#src/costing/split-kits.ts";
import { askedNeeds } from "./asked-price.ts";
import { type EditionKit, editionKit } from "./edition-kit.ts";
import { editionSale, orderNeeds } from "./edition-sale.ts";
import { type Fraction, fraction, minus, nearest, over, plus, times } from "./fraction.ts";
import { type Order, orderOf } from "./order.ts";
import { type PreparedChannel, sells } from "./prepared-channel.ts";
import type { PriceContext } from "./price-context.ts";
import { costOfMinutes, priceNow } from "./sold-kit.ts";

/**
 * One order of an edition in a channel, line by line. Each amount is known to the grain, and
 * `charged − taxInside − fee − postagePaid − packing − other = comesIn` and
 * `comesIn − cost − timeCost = left` hold to the last digit.
 */
export interface ChannelOrder {
  channel: string;
  name: string;
  /** Share of the edition's kits, and whole kits of the run by largest remainder. */
  share: Figure;
  kits: number;
  kitsPerOrder: string;
  taxStated: "inside" | "on-top";
  otherName: string;
  /** For one kit; the rest is for the order. */
  priceAsked: Figure;
  goods: Figure;
  postageCharged: Figure;
  /** What the buyer pays; without the tax that is added where prices are stated without it. */
  charged: Figure;
  taxInside: Figure;
  /** Added to `charged` and passed on; in no other line. */
  taxOnTop: Figure;
  fee: Figure;
  postagePaid: Figure;
  packing: Figure;
  other: Figure;
  comesIn: Figure;
  cost: Figure;
  /** Own time to sell, at the plan's rate. */
  timeCost: Figure;
  left: Figure;
  /** Making the kits and selling them. */
  minutes: Figure;
  perHour: Figure;
}

/**
 * The channels that sell an edition side by side (section 10), in their order, at the plan's prices.
 *
 * @example channelTable(context, "full")[0].comesIn → { known: true, value: "26.31" }
 */
export function channelTable(context: PriceContext, edition: string): ChannelOrder[] {
  const { lines } = editionSale(context.channels, { edition, channel: null });
  const kit = editionKit(context, edition);
  const counts = splitKits(
    kit.kits,
    lines.map(({ prepared }) => prepared.channel.weight),
  );
  return context.channels
    .filter((prepared) => sells(prepared, edition))
    .map((prepared) => {
      const place = lines.findIndex((line) => line.prepared === prepared);
      return channelOrder(context, edition, prepared, kit, {
        share: lines[place]?.share ?? null,
        kits: counts[place] ?? 0,
      });
    });
}

function channelOrder(
  context: PriceContext,
  edition: string,
  prepared: PreparedChannel,
  kit: EditionKit,
  sold: { share: Fraction | null; kits: number },
): ChannelOrder {
  const { channel } = prepared;
  const asked = priceNow(context, { edition, channel: channel.id });
  const listed = priceNow(context, { edition, channel: null }) !== null;
  const price = asked === null ? askedNeeds(prepared, edition, listed) : [];
  const order = orderOf(prepared, asked ?? 0n, context.unit);
  const share = sold.share === null ? 0n : nearest(times(sold.share, fraction(ONE)));
  return {
    channel: channel.id,
    name: channel.name,
    share: wholeFigure(share, []),
    kits: sold.kits,
    kitsPerOrder: channel.kitsPerOrder,
    taxStated: channel.taxStated,
    otherName: channel.other.name,
    ...takenLines(prepared, order, asked ?? 0n, price),
    ...leftLines(context, prepared, order, kit, price),
  };
}

function takenLines(
  { needs, postageCharged, taxOnTop }: PreparedChannel,
  order: Order,
  asked: bigint,
  price: Need[],
) {
  const charged = joinNeeds(price, needs.postage);
  const taxed = joinNeeds(charged, needs.tax);
  return {
    priceAsked: wholeFigure(asked, price),
    goods: wholeFigure(order.goods, price),
    postageCharged: wholeFigure(postageCharged, needs.postage),
    charged: wholeFigure(order.charged, charged),
    taxInside: wholeFigure(order.taxInside, taxOnTop ? [] : taxed),
    taxOnTop: wholeFigure(order.taxOnTop, taxed),
    fee: wholeFigure(order.fee, joinNeeds(charged, needs.fee)),
    postagePaid: wholeFigure(order.postagePaid, needs.postagePaid),
    packing: wholeFigure(order.packing, needs.packing),
    other: wholeFigure(nearest(order.other), needs.other),
  };
}

function leftLines(
  { hourRate }: PriceContext,
  prepared: PreparedChannel,
  order: Order,
  kit: EditionKit,
  price: Need[],
) {
  const { needs, kitsPerOrder } = prepared;
  const comesIn =
    order.charged - order.taxInside - order.fee - order.postagePaid - order.packing - nearest(order.other);
  const cost = nearest(times(kit.cost, kitsPerOrder));
  const timeCost = nearest(costOfMinutes(fraction(prepared.minutes), hourRate));
  const kept = joinNeeds(price, orderNeeds(prepared));
  const unrated = prepared.minutes > 0n && hourRate === null ? [need("no-hourly-rate", [{}])] : [];
  const timed = joinNeeds(needs.minutes, unrated);
  return {
    comesIn: wholeFigure(comesIn, kept),
    cost: wholeFigure(cost, kit.needs.cost),
    timeCost: wholeFigure(timeCost, timed),
    left: wholeFigure(comesIn - cost - timeCost, joinNeeds(kept, kit.needs.cost, timed)),
    ...hourLines(prepared, order, kit, kept),
  };
}

function hourLines(prepared: PreparedChannel, order: Order, kit: EditionKit, kept: Need[]) {
  const { kitsPerOrder, needs } = prepared;
  const minutes = plus(times(kit.minutes, kitsPerOrder), fraction(prepared.minutes));
  const pay = minus(order.kept, times(kit.withoutWork, kitsPerOrder));
  const idle = minutes.top === 0n;
  const absent = kit.needs.cost.filter(({ code }) => code === "not-in-run");
  const paid = joinNeeds(kept, kit.needs.withoutWork, needs.minutes);
  return {
    minutes: wholeFigure(nearest(minutes), joinNeeds(absent, needs.minutes)),
    perHour: wholeFigure(
      idle ? null : nearest(over(times(pay, fraction(60n * ONE)), minutes)),
      idle ? joinNeeds(paid, [need("no-work", [{}])]) : paid,
    ),
  };
}
