import { feeOn, taxInside, taxOnTop } from "./charged.ts";
import { type Fraction, fraction, minus, nearest, times } from "./fraction.ts";
import type { PreparedChannel } from "./prepared-channel.ts";

/** One order in a channel, in grains: `kept = charged − taxInside − fee − postagePaid − packing − other`. */
export interface Order {
  /** Price asked × kits in the order. */
  goods: bigint;
  /** Goods and postage; where prices are stated without tax, without the tax that is added. */
  charged: bigint;
  /** Tax inside what is charged; nothing where it is added on top. */
  taxInside: bigint;
  /** Tax added to what is charged and passed on: it is in no sum, but the fee may be taken on it. */
  taxOnTop: bigint;
  /** What the fee is taken on. */
  feeBase: bigint;
  fee: bigint;
  postagePaid: bigint;
  packing: bigint;
  other: Fraction;
  kept: Fraction;
}

/**
 * One order at a price asked (section 10): `(kP + s) − tax − fee − c − packing − other` with k kits in
 * it. Tax inside and fee are each rounded to `unit` (section 1.3); `unit` 1 leaves them unrounded. What
 * the fee is taken on is made of sums as they stand on the bill: of goods or goods and postage, the tax
 * that belongs to them, rounded, taken off or added where the fee is not on tax, or the tax is on top.
 *
 * @example 34.00 and 4.95 postage, 21 % inside, 1.5 % and 0.25, 5.05 paid:
 * tax 6.76, fee 0.83, kept 38.95 − 6.76 − 0.83 − 5.05 = 26.31
 */
export function orderOf(prepared: PreparedChannel, asked: bigint, unit: bigint): Order {
  const { postagePaid, packing, other, feeRate, feeFixed, taxRate } = prepared;
  const goods = nearest(times(fraction(asked), prepared.kitsPerOrder));
  const charged = goods + prepared.postageCharged;
  const inside = prepared.taxOnTop ? 0n : taxInside(charged, taxRate, unit);
  const feeBase = baseOfFee(prepared, prepared.channel.feeOnPostage ? charged : goods, unit);
  const fee = feeOn(feeBase, feeRate, feeFixed, unit);
  return {
    goods,
    charged,
    taxInside: inside,
    taxOnTop: prepared.taxOnTop ? taxOnTop(charged, taxRate, unit) : 0n,
    feeBase,
    fee,
    postagePaid,
    packing,
    other,
    kept: minus(fraction(charged - inside - fee - postagePaid - packing), other),
  };
}

function baseOfFee(prepared: PreparedChannel, sum: bigint, unit: bigint): bigint {
  const { taxRate, channel } = prepared;
  if (prepared.taxOnTop) return channel.feeOnTax ? sum + taxOnTop(sum, taxRate, unit) : sum;
  return channel.feeOnTax ? sum : sum - taxInside(sum, taxRate, unit);
}
