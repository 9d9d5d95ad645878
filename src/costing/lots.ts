import { toMinor } from "./money.ts";
import { divideUp, ORDER_MOST } from "./whole.ts";

/** Entries a table of lots may have; more than any board house or seller of parts needs. */
const TABLE_MOST = 2_000_000;

/** Lots at a total price (section 3), several of which may be combined. */
export interface LotTable {
  /** The cheapest lots that hold at least `quantity`; on a tie those that hold less. */
  cover: (quantity: number) => { quantity: number; cost: number } | null;
  /** Which lots those are: count of each lot, in the order of the breaks. */
  taken: (quantity: number) => number[];
}

interface Lot {
  size: number;
  price: number;
}

/**
 * Prepares lots for quantities up to `quantityMost` and orders of at most `cap` pieces. A lot's
 * price is what the seller charges for it, so each is rounded to the minor unit.
 *
 * @example lots of 10 for 8.00 and 50 for 20.00: 70 are covered by 50 + 10 + 10 for 36.00
 */
export function lotTable(
  breaks: readonly { quantity: number; price: string }[],
  currency: string,
  cap: number,
  quantityMost: number,
): LotTable {
  const lots = breaks.map(({ quantity, price }) => ({
    size: quantity,
    price: Number(toMinor(price, currency)),
  }));
  return cap === Number.POSITIVE_INFINITY
    ? openLots(lots, quantityMost)
    : cappedLots(lots, cap, quantityMost);
}

/**
 * Dynamic programme over "at least j pieces": best(j) = least over the lots of price + best(j −
 * size). Beyond size × (largest lot + 1) of the lot with the least price per piece, that lot is
 * certainly part of a best combination: among as many other lots as it has pieces, some add up to
 * a multiple of it, and exchanging those for it costs no more. So large quantities are first
 * reduced by whole such lots.
 */
function openLots(lots: readonly Lot[], quantityMost: number): LotTable {
  const best = cheapestPerPiece(lots);
  const { size, price } = lots[best] ?? { size: 1, price: 0 };
  const bound = size * (Math.max(...lots.map((lot) => lot.size)) + 1);
  const table = fill(lots, Math.min(bound, quantityMost, TABLE_MOST));
  const reduced = (quantity: number) => (quantity <= table.top ? 0 : divideUp(quantity - table.top, size));
  return {
    cover(quantity) {
      if (quantity > TABLE_MOST && bound > TABLE_MOST) return { quantity, cost: Number.POSITIVE_INFINITY };
      const whole = reduced(quantity);
      const rest = quantity - whole * size;
      const cost = (table.cost[rest] ?? 0) + whole * price;
      return {
        quantity: (table.pieces[rest] ?? 0) + whole * size,
        cost: cost <= ORDER_MOST ? cost : Number.POSITIVE_INFINITY,
      };
    },
    taken(quantity) {
      const whole = reduced(quantity);
      const counts = unwind(lots, table.last, quantity - whole * size);
      counts[best] = (counts[best] ?? 0) + whole;
      return counts;
    },
  };
}

function cheapestPerPiece(lots: readonly Lot[]): number {
  return lots.reduce((best, lot, index) => {
    const held = lots[best] ?? lot;
    return BigInt(lot.price) * BigInt(held.size) < BigInt(held.price) * BigInt(lot.size) ? index : best;
  }, 0);
}

function fill(lots: readonly Lot[], top: number) {
  const cost = new Float64Array(top + 1);
  const pieces = new Float64Array(top + 1);
  const last = new Int32Array(top + 1);
  for (let need = 1; need <= top; need += 1) {
    cost[need] = Number.POSITIVE_INFINITY;
    lots.forEach((lot, index) => {
      const rest = Math.max(0, need - lot.size);
      const total = lot.price + (cost[rest] ?? 0);
      const held = lot.size + (pieces[rest] ?? 0);
      if (total > (cost[need] ?? 0) || (total === cost[need] && held >= (pieces[need] ?? 0))) return;
      cost[need] = total;
      pieces[need] = held;
      last[need] = index;
    });
  }
  return { top, cost, pieces, last };
}

/**
 * With a limit on the pieces of an order the best cover may hold too many, so here the programme
 * runs over "exactly x pieces" up to the limit, and the cover is the best x at or above the need.
 */
function cappedLots(lots: readonly Lot[], cap: number, quantityMost: number): LotTable {
  const largest = Math.max(...lots.map((lot) => lot.size));
  const top = Math.min(cap, quantityMost + largest, TABLE_MOST);
  const { cost, last } = fillExactly(lots, top);
  const best = new Int32Array(top + 2).fill(-1);
  for (let pieces = top; pieces >= 0; pieces -= 1) {
    const above = best[pieces + 1] ?? -1;
    const here = cost[pieces] ?? Number.POSITIVE_INFINITY;
    const cheaperAbove = above >= 0 && (cost[above] ?? 0) < here;
    best[pieces] = cheaperAbove ? above : here < Number.POSITIVE_INFINITY ? pieces : above;
  }
  return {
    cover(quantity) {
      if (quantity > cap) return null;
      if (quantity > top) return { quantity, cost: Number.POSITIVE_INFINITY };
      const found = best[quantity] ?? -1;
      if (found < 0) return null;
      const total = cost[found] ?? 0;
      return { quantity: found, cost: total <= ORDER_MOST ? total : Number.POSITIVE_INFINITY };
    },
    taken: (quantity) => unwind(lots, last, Math.max(0, best[quantity] ?? 0)),
  };
}

function fillExactly(lots: readonly Lot[], top: number) {
  const cost = new Float64Array(top + 1).fill(Number.POSITIVE_INFINITY);
  const last = new Int32Array(top + 1);
  cost[0] = 0;
  for (let pieces = 1; pieces <= top; pieces += 1) {
    lots.forEach((lot, index) => {
      const total = lot.price + (cost[pieces - lot.size] ?? Number.POSITIVE_INFINITY);
      if (total >= (cost[pieces] ?? 0)) return;
      cost[pieces] = total;
      last[pieces] = index;
    });
  }
  return { cost, last };
}

function unwind(lots: readonly Lot[], last: Int32Array, quantity: number): number[] {
  const counts = lots.map(() => 0);
  for (let rest = quantity; rest > 0; ) {
    const lot = last[rest] ?? 0;
    counts[lot] = (counts[lot] ?? 0) + 1;
    rest -= lots[lot]?.size ?? rest;
  }
  return counts;
}
