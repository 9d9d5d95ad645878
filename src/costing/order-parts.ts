import type { PreparedPart, PreparedPlan, PreparedSupplier } from "./prepared-plan.ts";
import {
  MISSING,
  NOT_NEEDED,
  REFUSED,
  type RunSheet,
  SETTLED,
  SHORT,
  TOO_LARGE,
  UNPRICED,
} from "./run-sheet.ts";
import { type SplitPart, type SplitTable, splitTable } from "./split-order.ts";
import { chooseOffer, freightFor, type WeighedOffer } from "./supplier-choice.ts";

const NONE: ReadonlySet<number> = new Set();

/** What a supplier adds to the goods of one basket, in minor units (section 4.1 and 4.2). */
export interface BasketCharges {
  freight: number | null;
  fee: number;
  handling: number;
}

/**
 * Charges on a basket of `goods` minor units: the small-order fee below the supplier's minimum order
 * value, freight or none from its free value upward, and the handling fee.
 *
 * @example goods 500, minimum 2000, fee 400, flat 490: { freight: 490, fee: 400, handling: 0 }
 */
export function basketCharges(supplier: PreparedSupplier, goods: number): BasketCharges {
  return {
    freight: freightFor(supplier, goods),
    fee: goods < supplier.minimum ? supplier.fee : 0,
    handling: supplier.handling,
  };
}

/**
 * Orders every part of the run and fills the baskets. Where a supplier refuses an order as small as
 * its basket came out, the one furthest below its minimum is left out and its parts are chosen anew,
 * until no basket is refused; a part that only such a supplier sells stays unbought and says so.
 */
export function orderParts(prepared: PreparedPlan, sheet: RunSheet): void {
  sheet.goods.fill(0);
  sheet.orders.fill(0);
  if (sheet.splits.size > 0) sheet.splits.clear();
  if (sheet.barred.size > 0) sheet.barred.clear();
  for (let index = 0; index < prepared.parts.length; index += 1) orderPart(prepared, sheet, index, NONE);
  for (
    let refused = smallestBasket(prepared, sheet);
    refused !== null;
    refused = smallestBasket(prepared, sheet)
  ) {
    sheet.barred.set(refused, sheet.goods[refused] as number);
    reorder(prepared, sheet, refused);
  }
  for (const state of sheet.state) if (state > SETTLED) sheet.missing |= MISSING.goods;
}

function orderPart(
  prepared: PreparedPlan,
  sheet: RunSheet,
  index: number,
  barred: ReadonlySet<number>,
): void {
  const toBuy = sheet.toBuy[index] as number;
  const part = prepared.parts[index] as PreparedPart;
  const best = toBuy === 0 ? null : chooseOffer(part, toBuy, barred);
  if (best !== null) {
    take(sheet, index, best);
    return;
  }
  sheet.chosen[index] = null;
  sheet.quantity[index] = 0;
  sheet.cost[index] = 0;
  if (toBuy > 0) sheet.state[index] = takeSplit(sheet, index, part, barred);
  else sheet.state[index] = sheet.required[index] === 0 ? NOT_NEEDED : SETTLED;
}

function take(sheet: RunSheet, index: number, { offer, order }: WeighedOffer): void {
  sheet.state[index] = SETTLED;
  sheet.chosen[index] = offer;
  sheet.quantity[index] = order.quantity;
  sheet.cost[index] = order.cost;
  sheet.tier[index] = order.tier;
  addGoods(sheet, offer.supplier, order.cost, 1);
}

/** No single offer covers the part: a split, or the reason why there is none. */
function takeSplit(sheet: RunSheet, index: number, part: PreparedPart, barred: ReadonlySet<number>): number {
  const open = part.usable.filter(({ supplier }) => !barred.has(supplier.index));
  if (open.length === 0) return part.usable.length === 0 ? UNPRICED : REFUSED;
  if (open.some(({ ladder }) => ladder.cap === Number.POSITIVE_INFINITY)) return TOO_LARGE;
  const toBuy = sheet.toBuy[index] as number;
  const table = splitsOf(part, toBuy, barred);
  if (table.coverable < toBuy) return SHORT;
  const parts = table.split(toBuy);
  if (parts === null) return TOO_LARGE;
  sheet.splits.set(index, parts);
  for (const { offer, order } of parts) addGoods(sheet, offer.supplier, order.cost, 1);
  return SETTLED;
}

/** The split table of a part, kept while no supplier is barred, and doubled when it is too short. */
function splitsOf(part: PreparedPart, quantity: number, barred: ReadonlySet<number>): SplitTable {
  if (barred.size > 0) return splitTable(part, quantity, barred);
  if (part.split === null || (part.split.top < quantity && part.split.coverable >= quantity)) {
    part.split = splitTable(part, Math.min(2 * quantity, part.buyMost), barred);
  }
  return part.split;
}

function addGoods(sheet: RunSheet, supplier: PreparedSupplier, cost: number, lines: 1 | -1): void {
  sheet.goods[supplier.index] = (sheet.goods[supplier.index] as number) + lines * cost;
  sheet.orders[supplier.index] = (sheet.orders[supplier.index] as number) + lines;
}

/** Among suppliers that refuse their basket, the one furthest below its minimum; null: none. */
function smallestBasket(prepared: PreparedPlan, sheet: RunSheet): number | null {
  let found: PreparedSupplier | null = null;
  for (const supplier of prepared.suppliers) {
    const goods = sheet.goods[supplier.index] as number;
    if (!supplier.refusesSmall || sheet.orders[supplier.index] === 0 || goods >= supplier.minimum) continue;
    const further =
      found === null ||
      BigInt(goods) * BigInt(found.minimum) <
        BigInt(sheet.goods[found.index] as number) * BigInt(supplier.minimum);
    if (further) found = supplier;
  }
  return found === null ? null : found.index;
}

/** Chooses anew for the parts that were in a refused basket. */
function reorder(prepared: PreparedPlan, sheet: RunSheet, refused: number): void {
  const barred = new Set(sheet.barred.keys());
  for (let index = 0; index < prepared.parts.length; index += 1) {
    const orders = ordersOf(sheet, index);
    if (!orders.some(({ offer }) => offer.supplier.index === refused)) continue;
    for (const { offer, order } of orders) addGoods(sheet, offer.supplier, order.cost, -1);
    sheet.splits.delete(index);
    orderPart(prepared, sheet, index, barred);
  }
}

/** The orders of one part, single or split. */
export function ordersOf(sheet: RunSheet, index: number): SplitPart[] {
  const split = sheet.splits.get(index);
  if (split !== undefined) return split;
  const offer = sheet.chosen[index] ?? null;
  if (offer === null) return [];
  const order = {
    quantity: sheet.quantity[index] as number,
    cost: sheet.cost[index] as number,
    tier: sheet.tier[index] as number,
  };
  return [{ offer, covers: sheet.toBuy[index] as number, order }];
}
