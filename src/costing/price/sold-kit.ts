import { grains } from "#src/costing/grains.ts";
import type { Need } from "#src/costing/problem.ts";
import { joinNeeds, need } from "#src/costing/run-needs.ts";
import { askedPrice } from "./asked-price.ts";
import { MILLION } from "./charged.ts";
import {
  type EditionSale,
  editionSale,
  type KitSold,
  kitSoldAt,
  type Scope,
  saleNeeds,
  sellingMinutes,
  timeNeeds,
} from "./edition-sale.ts";
import { type Fraction, fraction, minus, NOTHING, times } from "./fraction.ts";
import type { SaleContext } from "./sale-context.ts";

/** What selling one kit of an edition brings and takes at a price; see `Needs` before any of it. */
export interface SoldKit extends KitSold {
  sale: EditionSale;
  /** In grains; null: not decided, or every channel has its own. */
  price: bigint | null;
  /** Own time to sell it, in grains of a minute, and what that comes to at the plan's rate. */
  minutes: Fraction;
  timeCost: Fraction;
  /** What it brings: kept less the time to sell it. */
  brings: Fraction;
  needs: { kept: Need[]; minutes: Need[]; timeCost: Need[]; brings: Need[] };
}

/**
 * One kit sold in a scope at a price in grains; the plan's own price where `price` is left out. Own work
 * is a cost at its rate whether it makes a kit or sells it, so the time to sell goes off what is kept.
 *
 * @example kept 25.1885, 18.45 minutes to sell it at 12.00 an hour: brings 21.4985
 */
export function soldKit(
  context: SaleContext,
  scope: Scope,
  price: bigint | null = priceNow(context, scope),
): SoldKit {
  const sale = editionSale(context.channels, scope);
  const sold = kitSoldAt(sale, price, context.unit) ?? { kept: NOTHING, net: NOTHING };
  const minutes = sellingMinutes(sale);
  const timeCost = costOfMinutes(minutes, context.hourRate);
  const kept = saleNeeds(sale, price);
  const ofMinutes = timeNeeds(sale);
  const unrated = minutes.top > 0n && context.hourRate === null ? [need("no-hourly-rate", [{}])] : [];
  const ofTime = joinNeeds(ofMinutes, unrated);
  return {
    ...sold,
    sale,
    price,
    minutes,
    timeCost,
    brings: minus(sold.kept, timeCost),
    needs: { kept, minutes: ofMinutes, timeCost: ofTime, brings: joinNeeds(kept, ofTime) },
  };
}

/** The price of a scope as the plan has it: an edition's list price, or what a channel asks for it. */
export function priceNow({ plan, channels, unit }: SaleContext, scope: Scope): bigint | null {
  const text = plan.editions.find(({ id }) => id === scope.edition)?.price ?? null;
  const listPrice = text === null ? null : grains(text);
  if (scope.channel === null) return listPrice;
  const prepared = channels.find(({ channel }) => channel.id === scope.channel);
  return prepared === undefined ? null : askedPrice(prepared, scope.edition, listPrice, unit);
}

/** `minutes ÷ 60 × rate`, exact; nothing while there is no rate. */
export function costOfMinutes(minutes: Fraction, hourRate: bigint | null): Fraction {
  return hourRate === null ? NOTHING : times(minutes, fraction(hourRate, 60n * MILLION));
}
