import { convertMinor } from "./conversion.ts";
import { grainShare } from "./grains.ts";
import { exactPrice, type Price, type Rung } from "./ladder.ts";
import { ordersOf } from "./order-parts.ts";
import type { PreparedOffer, PreparedPart, PreparedPlan } from "./prepared-plan.ts";
import { MISSING, type RunSheet } from "./run-sheet.ts";
import { addProduct, clearSum, sumOf, type WholeSum } from "./whole-sum.ts";

const MILLION = 1_000_000n;

/**
 * What a run leaves on the shelf and takes from it (section 8). What is left over of a part is worth
 * the price paid for it: the price of the break reached; by slice and in lots the mean, extended price ÷
 * pieces. Freight is not counted in: it was paid for this run's sake. Spare pieces count as used. Stock
 * taken counts at its book cost; a part without one leaves the used view not known.
 */
export function shelfValues(prepared: PreparedPlan, sheet: RunSheet): void {
  for (const sum of sheet.left) clearSum(sum);
  clearSum(sheet.stock);
  sheet.leftQuotients = 0n;
  sheet.keptQuotients = 0n;
  for (let index = 0; index < prepared.parts.length; index += 1) {
    const part = prepared.parts[index] as PreparedPart;
    const fromStock = sheet.fromStock[index] as number;
    if (fromStock > 0) takeStock(sheet, part, fromStock);
    const offer = sheet.chosen[index] ?? null;
    if (offer !== null) {
      const left = (sheet.quantity[index] as number) - (sheet.toBuy[index] as number);
      if (left > 0) leave(sheet, prepared, offer, left, index);
    } else if (sheet.splits.has(index)) leaveSplit(sheet, prepared, index);
  }
  total(prepared, sheet);
}

/**
 * Value of `left` pieces of an order, in grains.
 *
 * @example 265 LEDs left of 1000 bought at 0.062 → 16.43
 */
export function leftValue(
  offer: PreparedOffer,
  tier: number,
  quantity: number,
  cost: number,
  left: number,
): bigint {
  const { ladder, worth } = offer;
  if (ladder.model === "whole-order") {
    return BigInt(left) * exactPrice(ladder.rungs[tier] as Rung) * worth.millionth;
  }
  return grainShare(convertMinor(cost, worth), BigInt(left), BigInt(quantity));
}

function takeStock(sheet: RunSheet, part: PreparedPart, fromStock: number): void {
  if (part.book === null) sheet.missing |= MISSING.stock;
  else addPriced(sheet.stock, fromStock, part.book);
}

function addPriced(sum: WholeSum, pieces: number, price: Price): void {
  addProduct(sum, pieces, price.millionths, () => exactPrice(price));
}

/** Prices by the piece are summed as whole millionths for each currency and keep share. */
function leave(
  sheet: RunSheet,
  prepared: PreparedPlan,
  offer: PreparedOffer,
  left: number,
  index: number,
): void {
  const tier = sheet.tier[index] as number;
  const { ladder } = offer;
  if (ladder.model === "whole-order") {
    addPriced(sheet.left[offer.bucket] as WholeSum, left, ladder.rungs[tier] as Rung);
    return;
  }
  const value = leftValue(offer, tier, sheet.quantity[index] as number, sheet.cost[index] as number, left);
  addQuotient(sheet, prepared, offer, value);
}

function leaveSplit(sheet: RunSheet, prepared: PreparedPlan, index: number): void {
  for (const { offer, covers, order } of ordersOf(sheet, index)) {
    const left = order.quantity - covers;
    if (left > 0)
      addQuotient(sheet, prepared, offer, leftValue(offer, order.tier, order.quantity, order.cost, left));
  }
}

function addQuotient(sheet: RunSheet, prepared: PreparedPlan, offer: PreparedOffer, value: bigint): void {
  sheet.leftQuotients += value;
  sheet.keptQuotients += keptOf(value, prepared.buckets[offer.bucket]?.keepMillionths ?? 0n);
}

/**
 * The share of a value that keeps, to the nearest grain.
 *
 * @example half of 16.43 → 8.215
 */
export function keptOf(value: bigint, keepMillionths: bigint): bigint {
  return grainShare(value, keepMillionths, MILLION);
}

function total(prepared: PreparedPlan, sheet: RunSheet): void {
  let left = sheet.leftQuotients;
  let kept = sheet.keptQuotients;
  prepared.buckets.forEach(({ worth, keepMillionths }, index) => {
    const sum = sheet.left[index];
    const value = sum === undefined ? 0n : sumOf(sum) * worth.millionth;
    left += value;
    kept += (value * keepMillionths) / MILLION;
  });
  sheet.money.leftOver = left;
  sheet.money.keptOnShelf = kept;
  sheet.money.stockTaken = (sumOf(sheet.stock) * 10n ** 24n) / MILLION;
}
