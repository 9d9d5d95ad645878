import { convertMinor } from "./conversion.ts";
import type { Figure } from "./figure.ts";
import { figureOf, figurePer, wholeFigure } from "./figure-of.ts";
import { grainText } from "./grains.ts";
import { costOf, type Ladder, type Order, tierOf } from "./ladder.ts";
import { minorText } from "./money.ts";
import { ordersOf } from "./order-parts.ts";
import type { PreparedOffer, PreparedPart, PreparedPlan } from "./prepared-plan.ts";
import type { Need } from "./problem.ts";
import { joinNeeds, need, partNeeds } from "./run-needs.ts";
import type { BoughtUp, ConsideredOffer, PartLine, PartOrder, PartState } from "./run-result.ts";
import type { RunSheet } from "./run-sheet.ts";
import { keptOf, leftValue } from "./shelf.ts";
import { coverableOf, mostOf, type SplitPart } from "./split-order.ts";
import { better, type WeighedOffer, weigh } from "./supplier-choice.ts";
import { upToMultiple } from "./whole.ts";

const STATES: readonly PartState[] = ["not-needed", "settled", "unpriced", "short", "refused", "unpriced"];

/** Share of a basket's charges that falls to one order, in grains; and whether its freight is known. */
export interface OrderShare {
  share: bigint;
  needs: Need[];
}

/** Money of one part in grains: goods, what is left over and keeps, and stock taken at book cost. */
export interface PartMoney {
  goods: bigint;
  left: bigint;
  kept: bigint;
  stock: bigint;
}

/** Sums of one part; a part whose cost is not known has goods 0 and says so in its needs. */
export function partMoney(prepared: PreparedPlan, sheet: RunSheet, index: number): PartMoney {
  const part = prepared.parts[index] as PreparedPart;
  const money: PartMoney = { goods: 0n, left: 0n, kept: 0n, stock: 0n };
  for (const { offer, covers, order } of ordersOf(sheet, index)) {
    const left = leftValue(offer, order.tier, order.quantity, order.cost, order.quantity - covers);
    money.goods += convertMinor(order.cost, offer.worth);
    money.left += left;
    money.kept += keptOf(left, prepared.buckets[offer.bucket]?.keepMillionths ?? 0n);
  }
  money.stock = BigInt(sheet.fromStock[index] as number) * (part.bookMillionths ?? 0n) * 10n ** 18n;
  return money;
}

/** The line of one part: need, orders, costs, and every offer weighed. */
export function partLine(
  prepared: PreparedPlan,
  sheet: RunSheet,
  index: number,
  shareOf: (offer: PreparedOffer) => OrderShare,
): PartLine {
  const prepared_ = prepared.parts[index] as PreparedPart;
  const { part } = prepared_;
  const [need_, required, toBuy] = [sheet.need, sheet.required, sheet.toBuy].map(
    (of) => of[index] as number,
  ) as [number, number, number];
  const orders = ordersOf(sheet, index);
  const ordered = orders.reduce((sum, { order }) => sum + order.quantity, 0);
  const needs = partNeeds(prepared, sheet, index);
  const stockNeeds = stockNeedsOf(prepared_, sheet, index);
  const usedNeeds = joinNeeds(needs, stockNeeds);
  const money = partMoney(prepared, sheet, index);
  const used = money.goods - money.kept + money.stock;
  const state = STATES[sheet.state[index] as number] as PartState;
  return {
    id: part.id,
    name: part.name,
    designators: part.designators,
    state,
    need: need_,
    spare: required - need_,
    required,
    fromStock: sheet.fromStock[index] as number,
    toBuy,
    orders: orders.map((order) => partOrder(order, prepared_, shareOf)),
    ordered,
    leftOver: orders.length === 0 ? 0 : ordered - toBuy,
    shortBy: state === "short" ? toBuy - coverableOf(prepared_, sheet.barred) : 0,
    goods: wholeFigure(money.goods, needs),
    landed: landedOf(orders, money.goods, needs, shareOf),
    leftOverValue: wholeFigure(money.left, needs),
    keptOnShelf: wholeFigure(money.kept, needs),
    stockTaken: wholeFigure(money.stock, stockNeeds),
    perKit: {
      spent: perKit(money.goods, sheet.kits, needs),
      used: perKit(used, sheet.kits, usedNeeds),
    },
    considered: considered(prepared_, sheet, index, toBuy),
  };
}

function perKit(value: bigint, kits: number, needs: Need[]): Figure {
  return needs.length > 0 ? wholeFigure(null, needs) : figurePer(value, kits, needs);
}

function stockNeedsOf({ part, bookMillionths }: PreparedPart, sheet: RunSheet, index: number): Need[] {
  const missing = bookMillionths === null && (sheet.fromStock[index] as number) > 0;
  return missing ? [need("no-stock-cost", [{ part: part.id }])] : [];
}

function landedOf(
  orders: readonly SplitPart[],
  goods: bigint,
  needs: Need[],
  shareOf: (offer: PreparedOffer) => OrderShare,
): Figure {
  const shares = orders.map(({ offer }) => shareOf(offer));
  const charges = shares.reduce((sum, { share }) => sum + share, 0n);
  if (needs.length > 0) return wholeFigure(null, needs);
  return figureOf(goods + charges, joinNeeds(...shares.map((share) => share.needs)));
}

function partOrder(
  { offer, covers, order }: SplitPart,
  { part }: PreparedPart,
  shareOf: (offer: PreparedOffer) => OrderShare,
): PartOrder {
  const goods = convertMinor(order.cost, offer.worth);
  const { share, needs } = shareOf(offer);
  const currency = offer.worth.currency;
  return {
    offer: offer.offer.id,
    supplier: offer.supplier.id,
    orderCode: offer.offer.orderCode,
    currency,
    quantity: order.quantity,
    breakReached: breakReached(offer.ladder, offer.offer.breaks, order),
    lots: lotsTaken(offer.ladder, offer.offer.breaks, covers),
    extended: minorText(order.cost, currency),
    extendedConverted: grainText(goods),
    landed: figureOf(goods + share, needs),
    pinned: part.pinnedOffer === offer.offer.id,
    boughtUp: boughtUp(offer.ladder, currency, covers, order),
  };
}

type Breaks = readonly { quantity: number; price: string }[];

/** The break an order reaches, as its offer states it; null for lots. */
export function breakReached(ladder: Ladder, breaks: Breaks, { tier }: Order): PartOrder["breakReached"] {
  return ladder.model === "lots" ? null : (breaks.toSorted((a, b) => a.quantity - b.quantity)[tier] ?? null);
}

/** The lots that cover a quantity, largest first; empty for other price models. */
export function lotsTaken(ladder: Ladder, breaks: Breaks, quantity: number): PartOrder["lots"] {
  const counts = ladder.lots?.taken(Math.max(quantity, ladder.minimum)) ?? [];
  const ascending = breaks.toSorted((a, b) => a.quantity - b.quantity);
  return ascending
    .map((lot, index) => ({ ...lot, count: counts[index] ?? 0 }))
    .filter(({ count }) => count > 0)
    .reverse();
}

/**
 * Whether an order goes past the least permitted quantity because a higher break costs less
 * (section 3): instead of how many, what those would cost, and what it saves.
 *
 * @example 84 would cost 9.90, 100 cost 8.00 → instead of 84, saves 1.90, 16 left over
 */
export function boughtUp(ladder: Ladder, currency: string, quantity: number, order: Order): BoughtUp | null {
  if (ladder.model !== "whole-order") return null;
  const insteadOf = upToMultiple(Math.max(quantity, ladder.minimum), ladder.multiple);
  if (insteadOf >= order.quantity) return null;
  const cost = costOf(ladder, tierOf(ladder, insteadOf), insteadOf);
  if (cost === Number.POSITIVE_INFINITY) return null;
  return {
    insteadOf,
    insteadOfCosts: minorText(cost, currency),
    saves: minorText(cost - order.cost, currency),
    leftOver: order.quantity - quantity,
  };
}

/** Every offer of the part weighed for what is to buy: usable ones best first, then those set aside. */
function considered(part: PreparedPart, sheet: RunSheet, index: number, toBuy: number): ConsideredOffer[] {
  const taken = new Set(ordersOf(sheet, index).map(({ offer }) => offer.offer.id));
  const rows = part.offers.map(({ offer, standing, prepared }) => {
    const weighed = prepared === null || toBuy === 0 ? null : weigh(prepared, toBuy);
    const row = consideredRow(prepared, weighed, toBuy);
    const barred = prepared !== null && sheet.barred.has(prepared.supplier.index);
    return {
      weighed,
      row: {
        offer: offer.id,
        supplier: offer.supplier,
        chosen: taken.has(offer.id),
        pinned: part.part.pinnedOffer === offer.id,
        currency: offer.currency,
        ...row,
        standing: standing === "usable" ? (barred ? "minimum-not-reached" : row.standing) : standing,
      },
    };
  });
  const before = (a: (typeof rows)[number], b: (typeof rows)[number]) => {
    if (a.weighed === null || b.weighed === null)
      return Number(a.weighed === null) - Number(b.weighed === null);
    return better(a.weighed, b.weighed) ? -1 : better(b.weighed, a.weighed) ? 1 : 0;
  };
  return rows.sort(before).map(({ row }) => row);
}

function consideredRow(offer: PreparedOffer | null, weighed: WeighedOffer | null, toBuy: number) {
  const short = offer !== null && weighed === null && offer.ladder.cap !== Number.POSITIVE_INFINITY;
  return {
    quantity: weighed?.order.quantity ?? null,
    extended: weighed && minorText(weighed.order.cost, weighed.offer.worth.currency),
    aloneLanded: weighed?.freightKnown ? grainText(convertMinor(weighed.alone, weighed.offer.worth)) : null,
    leftOver: weighed && weighed.order.quantity - toBuy,
    shortBy: short && toBuy > 0 ? Math.max(0, toBuy - mostOf(offer)) : 0,
    standing: (short && toBuy > 0
      ? "short"
      : weighed === null && toBuy > 0
        ? "amount-too-large"
        : "usable") as ConsideredOffer["standing"],
  };
}
