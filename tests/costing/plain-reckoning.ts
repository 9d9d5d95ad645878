import { Decimal } from "decimal.js";
import type {
  Plan,
  PlanBoardQuote,
  PlanChannel,
  PlanOffer,
  PlanPart,
  PlanSupplier,
} from "#src/shapes/plan.ts";

/**
 * The method read a second time, as plainly as possible: one run size after the other, every offer
 * and every break tried with decimal.js, nothing prepared, nothing remembered. Checks and the bench
 * compare the core with it. It knows the price models by trying every quantity up to the last
 * break, offers without stock limits, and suppliers that do not refuse small orders.
 */
const D = Decimal.clone({ precision: 60, rounding: Decimal.ROUND_HALF_UP });
type D = Decimal;

/** Each text is read once, as anybody would who cares a little for speed. */
const read = new Map<string, D>();
function dec(text: string | number): D {
  if (typeof text === "number") return new D(text);
  const known = read.get(text);
  if (known !== undefined) return known;
  const value = new D(text);
  read.set(text, value);
  return value;
}

/** Minor units' decimals of the currencies these plans use (ISO 4217). */
const DECIMALS: Record<string, number> = { EUR: 2, USD: 2, GBP: 2, JPY: 0, KWD: 3 };

export interface PlainRun {
  spent: string;
  used: string;
  brings: string;
  leftOver: string;
  parcels: number;
}

/** Quotients are taken to the 24th decimal, as the core states it. */
function quotient(value: D): D {
  return value.toDecimalPlaces(24, Decimal.ROUND_HALF_UP);
}

function rounded(value: D, currency: string): D {
  return value.toDecimalPlaces(DECIMALS[currency] ?? 2, Decimal.ROUND_HALF_UP);
}

export function rateOf(plan: Plan, currency: string): D {
  if (currency === plan.currency) return new D(1);
  return dec(plan.rates.find((rate) => rate.currency === currency)?.perForeignUnit ?? Number.NaN);
}

/** Largest remainder: whole quotas first, then one each by what is left of the division, the earlier first. */
export function plainSplit(kits: number, weights: readonly number[]): number[] {
  const total = weights.reduce((a, b) => a + b, 0);
  const counts = weights.map((weight) => Math.floor((kits * weight) / total));
  const rests = weights.map((weight) => (kits * weight) % total);
  while (counts.reduce((a, b) => a + b, 0) < kits) {
    const best = rests.indexOf(Math.max(...rests));
    counts[best] = (counts[best] ?? 0) + 1;
    rests[best] = -1;
  }
  return counts;
}

export interface PlainOrder {
  quantity: number;
  cost: D;
}

const ladders = new WeakMap<object, PlanOffer["breaks"]>();
function ascending(breaks: PlanOffer["breaks"]): PlanOffer["breaks"] {
  const known = ladders.get(breaks);
  if (known !== undefined) return known;
  const sorted = breaks.toSorted((a, b) => a.quantity - b.quantity);
  ladders.set(breaks, sorted);
  return sorted;
}

/** Every sensible quantity tried: the least permitted, and the first permitted at every break above it. */
export function plainOrder(
  offer: Pick<PlanOffer, "breaks" | "minimumOrder" | "orderMultiple" | "currency">,
  need: number,
): PlainOrder {
  const breaks = ascending(offer.breaks);
  const least = Math.max(need, offer.minimumOrder, breaks[0]?.quantity ?? 1);
  let best: PlainOrder | null = null;
  for (let step = -1; step < breaks.length; step += 1) {
    const from = step < 0 ? least : (breaks[step]?.quantity ?? 0);
    if (step >= 0 && from <= least) continue;
    const quantity = Math.ceil(from / offer.orderMultiple) * offer.orderMultiple;
    const cost = rounded(dec(priceAt(breaks, quantity)).times(quantity), offer.currency);
    if (best === null || cost.lt(best.cost) || (cost.eq(best.cost) && quantity < best.quantity)) {
      best = { quantity, cost };
    }
  }
  return best as PlainOrder;
}

function priceAt(breaks: PlanOffer["breaks"], quantity: number): string {
  let reached = 0;
  while ((breaks[reached + 1]?.quantity ?? Number.POSITIVE_INFINITY) <= quantity) reached += 1;
  return breaks[reached]?.price ?? "NaN";
}

function freightOf(supplier: PlanSupplier, goods: D): D {
  if (supplier.freeFreightFrom !== null && goods.gte(supplier.freeFreightFrom)) return new D(0);
  return supplier.freight.model === "flat"
    ? rounded(dec(supplier.freight.amount), supplier.currency)
    : new D(0);
}

interface Choice {
  offer: PlanOffer;
  supplier: PlanSupplier;
  order: PlainOrder;
  alone: D;
}

function choose(plan: Plan, part: PlanPart, toBuy: number): Choice {
  let best: Choice | null = null;
  for (const offer of part.offers) {
    const supplier = plan.suppliers.find(({ id }) => id === offer.supplier) as PlanSupplier;
    const order = plainOrder(offer, toBuy);
    const alone = order.cost.plus(freightOf(supplier, order.cost)).times(rateOf(plan, offer.currency));
    const choice = { offer, supplier, order, alone };
    if (best === null || beats(choice, best)) best = choice;
  }
  return best as Choice;
}

function beats(a: Choice, b: Choice): boolean {
  if (!a.alone.eq(b.alone)) return a.alone.lt(b.alone);
  if (a.order.quantity !== b.order.quantity) return a.order.quantity < b.order.quantity;
  if (a.supplier.name !== b.supplier.name) return a.supplier.name < b.supplier.name;
  if (a.supplier.id !== b.supplier.id) return a.supplier.id < b.supplier.id;
  return a.offer.id < b.offer.id;
}

/** Fewest boards with enough good ones at the confidence, by the binomial distribution term by term. */
export function plainBoards(required: number, yieldShare: string, confidence: string): number {
  for (let boards = required; ; boards += 1) {
    const good = new D(yieldShare);
    const bad = new D(1).minus(good);
    let term = good.pow(boards);
    let enough = new D(0);
    for (let faulty = 0; faulty <= boards - required; faulty += 1) {
      enough = enough.plus(term);
      term = good.isZero()
        ? new D(0)
        : term
            .times(boards - faulty)
            .div(faulty + 1)
            .times(bad)
            .div(good);
    }
    if (enough.gte(confidence)) return boards;
  }
}

/** Pieces that hold the boards, each priced with the depanelling of its boards. */
function boardOrder(stated: PlanBoardQuote, boards: number): PlainOrder {
  const hold = stated.boardsPerPanel ?? 1;
  const need = Math.ceil(boards / hold);
  const broken = dec(stated.depanelling).times(hold);
  if (stated.priceModel === "formula") return { quantity: need, cost: byFormula(stated, need, hold) };
  const { priceModel } = stated;
  const quote = {
    ...stated,
    priceModel,
    breaks: stated.breaks.map(({ quantity, price }) => ({
      quantity,
      price: broken
        .times(priceModel === "lots" ? quantity : 1)
        .plus(price)
        .toFixed(),
    })),
  };
  if (priceModel === "whole-order") return plainOrder({ ...quote, minimumOrder: 1, orderMultiple: 1 }, need);
  const best: PlainOrder[] = [{ quantity: 0, cost: new D(0) }];
  for (let pieces = 1; pieces <= need; pieces += 1) {
    for (const lot of quote.breaks) {
      const before = best[Math.max(0, pieces - lot.quantity)] as PlainOrder;
      const order = {
        quantity: before.quantity + lot.quantity,
        cost: before.cost.plus(rounded(dec(lot.price), quote.currency)),
      };
      const held = best[pieces];
      if (
        held === undefined ||
        order.cost.lt(held.cost) ||
        (order.cost.eq(held.cost) && order.quantity < held.quantity)
      ) {
        best[pieces] = order;
      }
    }
  }
  return best[need] as PlainOrder;
}

/** Set-up, area and boards; square millimetres in a square decimetre 10^4, in a square metre 10^6. */
function byFormula(
  { formula, pieceSize, depanelling, currency }: PlanBoardQuote,
  pieces: number,
  hold: number,
): D {
  if (formula === null || pieceSize === null) throw new Error("A formula without its terms.");
  const area = dec(pieceSize.width)
    .times(pieceSize.height)
    .div(formula.areaUnit === "dm2" ? 1e4 : 1e6);
  const each = area.times(formula.areaRate).plus(dec(formula.perBoard).plus(depanelling).times(hold));
  return rounded(each.times(pieces).plus(formula.setUp), currency);
}

/** Σ i^(log2 slope), each factor to 12 decimals, for the kits after those made before. */
const factors = new Map<string, D>();
function factor(slope: string, number: number): D {
  const key = `${slope}:${number}`;
  const known = factors.get(key);
  if (known !== undefined) return known;
  const value = new D(number)
    .pow(new D(slope).ln().div(new D(2).ln()))
    .toDecimalPlaces(12, Decimal.ROUND_HALF_UP);
  factors.set(key, value);
  return value;
}

/** One run, from the plan alone. Sizes of boards already worked out may be handed in. */
export function plainRun(plan: Plan, kits: number, boardsFor = plainBoards): PlainRun {
  const kitsOf = plainSplit(
    kits,
    plan.editions.map(({ weight }) => weight),
  );
  const kitsIn = (editions: string[] | null) =>
    plan.editions.reduce(
      (sum, { id }, at) => sum + (editions === null || editions.includes(id) ? (kitsOf[at] ?? 0) : 0),
      0,
    );
  let spent = new D(0);
  let left = new D(0);
  let kept = new D(0);
  let stock = new D(0);
  const goods = new Map<PlanSupplier, D>();
  for (const part of plan.parts) {
    const need = part.quantities.reduce((sum, { edition, perKit }) => sum + kitsIn([edition]) * perKit, 0);
    const spare =
      need === 0 ? 0 : Math.max(part.leastSpare, dec(part.spareRate).times(need).ceil().toNumber());
    const fromStock = Math.min(part.freeStock.quantity, need + spare);
    const toBuy = need + spare - fromStock;
    stock = stock.plus(dec(part.freeStock.bookCost ?? 0).times(fromStock));
    if (toBuy === 0) continue;
    const { offer, supplier, order } = choose(plan, part, toBuy);
    goods.set(supplier, (goods.get(supplier) ?? new D(0)).plus(order.cost));
    const value = dec(priceAt(ascending(offer.breaks), order.quantity))
      .times(order.quantity - toBuy)
      .times(rateOf(plan, offer.currency));
    left = left.plus(value);
    kept = kept.plus(value.times(part.keepShare));
  }
  for (const [supplier, sum] of goods) {
    const small = supplier.minimumOrderValue !== null && sum.lt(supplier.minimumOrderValue);
    const fee =
      small && supplier.belowMinimum.term === "fee"
        ? rounded(dec(supplier.belowMinimum.fee), supplier.currency)
        : new D(0);
    const handling = rounded(dec(supplier.handlingFee), supplier.currency);
    spent = spent.plus(
      sum.plus(fee).plus(handling).plus(freightOf(supplier, sum)).times(rateOf(plan, supplier.currency)),
    );
  }
  let parcels = goods.size;
  const boards = plan.boards.needed
    ? kitsOf.reduce((sum, count, at) => sum + count * (plan.editions[at]?.boardsPerKit ?? 0), 0)
    : 0;
  if (boards > 0) {
    const toOrder = boardsFor(boards, plan.boards.yield, plan.boards.confidence);
    const landed = plan.boards.quotes.map((quote) =>
      boardOrder(quote, toOrder)
        .cost.plus(rounded(dec(quote.engineeringCharge), quote.currency))
        .plus(rounded(dec(quote.stencilCharge), quote.currency))
        .plus(rounded(dec(quote.freight ?? 0), quote.currency))
        .times(rateOf(plan, quote.currency)),
    );
    spent = spent.plus(D.min(...landed));
    parcels += 1;
  }
  for (const item of plan.packing) spent = spent.plus(dec(item.costPerKit ?? 0).times(kitsIn(item.editions)));
  for (const task of plan.work.tasks) {
    const made = kitsIn(task.editions);
    let sum = new D(0);
    for (let kit = 1; kit <= made; kit += 1)
      sum = sum.plus(factor(plan.work.learningSlope, plan.work.kitsMadeBefore + kit));
    const minutes = dec(task.minutesPerKit)
      .times(sum)
      .plus(made > 0 ? task.setUpMinutes : 0);
    spent = spent.plus(quotient(minutes.times(plan.work.ratePerHour ?? 0).div(60)));
  }
  for (const charge of plan.charges) {
    const share = charge.spreadOver === null ? new D(1) : D.min(1, new D(kits).div(charge.spreadOver));
    spent = spent.plus(quotient(dec(charge.amount).times(share)));
  }
  spent = spent.plus(
    dec(plan.replacements.share)
      .times(kits)
      .times(plan.replacements.costEach ?? 0),
  );
  return {
    spent: spent.toFixed(),
    used: spent.minus(kept).plus(stock).toFixed(),
    brings: quotient(
      plan.editions.reduce(
        (sum, edition, at) => sum.plus(broughtByOne(plan, edition.price ?? "0").times(kitsOf[at] ?? 0)),
        new D(0),
      ),
    ).toFixed(),
    leftOver: left.toFixed(),
    parcels,
  };
}

/** What one kit brings over the channels that all sell every edition: kept less the time to sell it, at its rate. */
function broughtByOne({ channels, currency, work }: Plan, price: string): D {
  const weights = channels.reduce((sum, { weight }) => sum + weight, 0);
  return channels.reduce((sum, channel) => {
    const minutes = dec(channel.minutesPerOrder ?? 0)
      .times(work.ratePerHour ?? 0)
      .div(60);
    const order = keptOfOrder(channel, price, currency).minus(minutes);
    return sum.plus(order.div(channel.kitsPerOrder).times(channel.weight).div(weights));
  }, new D(0));
}

function keptOfOrder(channel: PlanChannel, price: string, currency: string): D {
  const charged = dec(price)
    .times(channel.kitsPerOrder)
    .plus(channel.postageCharged ?? 0);
  const rate = dec(channel.taxRate ?? 0);
  const tax = rounded(charged.times(rate).div(rate.plus(1)), currency);
  const fee = rounded(charged.times(channel.feeRate ?? 0).plus(channel.feeFixed ?? 0), currency);
  return charged
    .minus(tax)
    .minus(fee)
    .minus(channel.postagePaid ?? 0);
}
