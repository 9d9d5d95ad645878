import { allocate } from "./allocate.ts";
import { convertMinor, type MinorWorth } from "./conversion.ts";
import type { Figure } from "./figure.ts";
import { figureOf } from "./figure-of.ts";
import { minorText } from "./money.ts";
import { basketCharges, ordersOf } from "./order-parts.ts";
import type { OrderShare } from "./part-lines.ts";
import type { PreparedOffer, PreparedPlan, PreparedSupplier } from "./prepared-plan.ts";
import { need } from "./run-needs.ts";
import type { Basket } from "./run-result.ts";
import type { RunSheet } from "./run-sheet.ts";
import type { SplitPart } from "./split-order.ts";

interface Line extends SplitPart {
  part: string;
}

/** The baskets of a run and every order's share of its basket's charges. */
export interface Baskets {
  baskets: Basket[];
  shareOf: (offer: PreparedOffer) => OrderShare;
}

/**
 * Baskets by supplier (section 4), with landed cost by line: extended price and its share by value
 * of freight, small-order fee and handling. Shares are exact and sum to the basket's charges.
 *
 * @example goods 6.00 and 2.00, freight 4.90 → landed 9.675 and 3.225
 */
export function basketResults(prepared: PreparedPlan, sheet: RunSheet): Baskets {
  const shares = new Map<PreparedOffer, OrderShare>();
  const lines = prepared.parts.flatMap(({ part }, index) =>
    ordersOf(sheet, index).map((order): Line => ({ ...order, part: part.id })),
  );
  const baskets = prepared.suppliers.flatMap((supplier) => {
    const own = lines.filter(({ offer }) => offer.supplier === supplier);
    if (own.length === 0 || supplier.worth === null) return [];
    setShares(supplier, supplier.worth, own, sheet, shares);
    return [basket(supplier, supplier.worth, own, sheet, shares)];
  });
  return {
    baskets: inPlanOrder(prepared, baskets),
    shareOf: (offer) => shares.get(offer) ?? { share: 0n, needs: [] },
  };
}

function inPlanOrder({ plan }: PreparedPlan, baskets: Basket[]): Basket[] {
  return plan.suppliers.flatMap(({ id }) => baskets.find(({ supplier }) => supplier === id) ?? []);
}

function setShares(
  supplier: PreparedSupplier,
  worth: MinorWorth,
  lines: readonly Line[],
  sheet: RunSheet,
  shares: Map<PreparedOffer, OrderShare>,
): void {
  const { freight, fee, handling } = basketCharges(supplier, sheet.goods[supplier.index] as number);
  const charges = convertMinor((freight ?? 0) + fee + handling, worth);
  const parts = allocate(
    charges,
    lines.map(({ order }) => BigInt(order.cost)),
  );
  const needs = freight === null ? [need("no-freight", [{ supplier: supplier.id }])] : [];
  lines.forEach(({ offer }, index) => {
    shares.set(offer, { share: parts[index] ?? 0n, needs });
  });
}

function basket(
  supplier: PreparedSupplier,
  worth: MinorWorth,
  lines: readonly Line[],
  sheet: RunSheet,
  shares: ReadonlyMap<PreparedOffer, OrderShare>,
): Basket {
  const goods = sheet.goods[supplier.index] as number;
  const { freight, fee, handling } = basketCharges(supplier, goods);
  const { currency } = worth;
  const needs = freight === null ? [need("no-freight", [{ supplier: supplier.id }])] : [];
  const charges = (freight ?? 0) + fee + handling;
  const inCurrency = (minor: number): Figure =>
    needs.length === 0
      ? { known: true, value: minorText(minor, currency) }
      : { known: false, needs, without: minorText(minor, currency) };
  const reached = goods >= supplier.freeFrom;
  return {
    supplier: supplier.id,
    name: supplier.terms.name,
    currency,
    lines: lines.map(({ part, offer, order }) => {
      const share = shares.get(offer);
      return {
        part,
        offer: offer.offer.id,
        quantity: order.quantity,
        extended: minorText(order.cost, currency),
        landed: figureOf(convertMinor(order.cost, worth) + (share?.share ?? 0n), needs),
      };
    }),
    goods: minorText(goods, currency),
    smallOrderFee: minorText(fee, currency),
    freight: inCurrency(freight ?? 0),
    handling: minorText(handling, currency),
    total: inCurrency(goods + charges),
    converted: {
      goods: figureOf(convertMinor(goods, worth), []),
      charges: figureOf(convertMinor(charges, worth), needs),
      total: figureOf(convertMinor(goods + charges, worth), needs),
    },
    rate: worth.rate,
    freeFreightReached: reached,
    toFreeFreight:
      reached || supplier.freeFrom === Number.POSITIVE_INFINITY
        ? null
        : minorText(supplier.freeFrom - goods, currency),
  };
}
