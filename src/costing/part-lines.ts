import { considered } from "./considered-offers.ts";
import { convertMinor } from "./conversion.ts";
import type { Figure } from "./figure.ts";
import { figureOf, figurePer, wholeFigure } from "./figure-of.ts";
import { exactPrice } from "./ladder.ts";
import { pricedOrder } from "./order-details.ts";
import { ordersOf } from "./order-parts.ts";
import type { PreparedOffer, PreparedPart, PreparedPlan } from "./prepared-plan.ts";
import type { Need } from "./problem.ts";
import { joinNeeds, need, partNeeds } from "./run-needs.ts";
import type { PartLine, PartOrder, PartState } from "./run-result.ts";
import type { RunSheet } from "./run-sheet.ts";
import { keptOf, leftValue } from "./shelf.ts";
import { coverableOf, type SplitPart } from "./split-order.ts";

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
  money.stock =
    BigInt(sheet.fromStock[index] as number) * (part.book === null ? 0n : exactPrice(part.book)) * 10n ** 18n;
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

function stockNeedsOf({ part, book }: PreparedPart, sheet: RunSheet, index: number): Need[] {
  const missing = book === null && (sheet.fromStock[index] as number) > 0;
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
  const { share, needs } = shareOf(offer);
  return {
    ...pricedOrder(offer, covers, order),
    landed: figureOf(convertMinor(order.cost, offer.worth) + share, needs),
    pinned: part.pinnedOffer === offer.offer.id,
  };
}
