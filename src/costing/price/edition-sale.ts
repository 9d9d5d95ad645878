import type { Need } from "#src/costing/problem.ts";
import { joinNeeds, need } from "#src/costing/run-needs.ts";
import { askedNeeds, askedPrice } from "./asked-price.ts";
import { MILLION } from "./charged.ts";
import { type Fraction, fraction, NOTHING, over, plus, times } from "./fraction.ts";
import { orderOf } from "./order.ts";
import { type PreparedChannel, sells } from "./prepared-channel.ts";

/** Which price is meant: what one channel asks for an edition, or, with null, its list price over all channels. */
export interface Scope {
  edition: string;
  channel: string | null;
}

/** How an edition is sold: by the channels that have it, each with its share of the edition's kits. */
export interface EditionSale {
  scope: Scope;
  lines: { prepared: PreparedChannel; share: Fraction }[];
}

/** One kit sold, over the channels by share: what is kept of it and its price without tax. */
export interface KitSold {
  kept: Fraction;
  net: Fraction;
}

/**
 * The channels that sell an edition. Shares are weighted exactly: a share is the channel's weight over
 * the weights of all that sell the edition. In a single channel's scope that channel has all of it.
 *
 * @example weights 55, 20, 15 and 10, the last without this edition → 55/90, 20/90, 15/90
 */
export function editionSale(channels: readonly PreparedChannel[], scope: Scope): EditionSale {
  const { edition, channel } = scope;
  const selling = channels.filter((one) => sells(one, edition));
  if (channel !== null) {
    const only = selling.filter((one) => one.channel.id === channel);
    return { scope, lines: only.map((prepared) => ({ prepared, share: fraction(1n) })) };
  }
  const sharing = selling.filter(({ weight }) => weight > 0n);
  const total = sharing.reduce((sum, { weight }) => sum + weight, 0n);
  return {
    scope,
    lines: sharing.map((prepared) => ({ prepared, share: fraction(prepared.weight, total) })),
  };
}

/** What a line asks when the price in question is `price`, in grains; null while it is not decided. */
export function askedIn(
  { scope }: EditionSale,
  prepared: PreparedChannel,
  price: bigint | null,
  unit: bigint,
): bigint | null {
  return scope.channel === null ? askedPrice(prepared, scope.edition, price, unit) : price;
}

/**
 * One kit of an edition at a price (section 10): each channel's order over its kits, weighted by share.
 * `unit` as in `orderOf`. Null where a price is not decided; missing terms count as nothing, so ask
 * `saleNeeds` first.
 *
 * @example 26.31, 24.60, 25.70 and 19.43 by 55, 20, 15 and 10 → 25.1885 kept
 */
export function kitSoldAt(sale: EditionSale, price: bigint | null, unit: bigint): KitSold | null {
  let [kept, net] = [NOTHING, NOTHING];
  for (const { prepared, share } of sale.lines) {
    const asked = askedIn(sale, prepared, price, unit);
    if (asked === null) return null;
    const ofOrder = orderOf(prepared, asked, unit).kept;
    kept = plus(kept, times(share, over(ofOrder, prepared.kitsPerOrder)));
    net = plus(net, times(share, netOf(prepared, asked)));
  }
  return { kept, net };
}

/** A price asked, without its tax; exact. */
export function netOf({ taxOnTop, taxRate }: PreparedChannel, asked: bigint): Fraction {
  return taxOnTop ? fraction(asked) : fraction(asked * MILLION, MILLION + taxRate);
}

/** Own time to sell one kit, in grains of a minute. */
export function sellingMinutes({ lines }: EditionSale): Fraction {
  return lines.reduce(
    (sum, { prepared, share }) =>
      plus(sum, times(share, over(fraction(prepared.minutes), prepared.kitsPerOrder))),
    NOTHING,
  );
}

/** Why what is kept of a kit is not known at a price; empty when it is. */
export function saleNeeds(sale: EditionSale, price: bigint | null): Need[] {
  const { edition, channel } = sale.scope;
  if (sale.lines.length === 0) return [need("not-sold", [{ edition }])];
  return joinNeeds(
    ...sale.lines.map(({ prepared }) => {
      // A channel's price that is not given may still lack only the tax to take off the list.
      const listed = price !== null || (channel !== null && prepared.needs.tax.length > 0);
      const asked = askedIn(sale, prepared, price, 1n) === null ? askedNeeds(prepared, edition, listed) : [];
      return [...asked, ...orderNeeds(prepared)];
    }),
  );
}

/** Terms that what is kept of an order needs; tax on top only where the fee is taken on it. */
export function orderNeeds({ needs, taxOnTop }: PreparedChannel): Need[] {
  const { postage, tax, fee, postagePaid, packing, other } = needs;
  return joinNeeds(postage, taxOnTop ? [] : tax, fee, postagePaid, packing, other);
}

/** Why the time to sell a kit is not known. */
export function timeNeeds({ lines }: EditionSale): Need[] {
  return joinNeeds(...lines.map(({ prepared }) => prepared.needs.minutes));
}
