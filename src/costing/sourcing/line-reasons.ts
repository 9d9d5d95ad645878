import { convertMinor } from "#src/costing/conversion.ts";
import { basketBill } from "./basket-bill.ts";
import { basketsOf, exactTotal, weighPlan } from "./held-plan.ts";
import type { Market, MarketSupplier } from "./market.ts";
import { exactOf } from "./undominated.ts";

/** Why a part is bought as it is: against the way whose goods alone cost least. Money in grains. */
export interface LineReason {
  part: number;
  /** The way, an index into the part's ways, whose goods cost least; the way taken where it is that one. */
  cheapest: number;
  /** By how much the goods are dearer here than there. */
  dearer: bigint;
  /** What the parcels cost, freight to broker, that buying it there would open; 0: those suppliers are used anyway. */
  parcels: bigint;
  /** By how much the whole plan would cost more if only this part were bought there; null: it would be refused. */
  moved: bigint | null;
}

/**
 * The reason of every line of a plan that is bought: 2.10 dearer than at the cheapest, but that would be a parcel of 6.90.
 */
export function lineReasons(market: Market, ways: Int32Array): LineReason[] {
  const baskets = basketsOf(market, ways);
  const held = weighPlan(market, ways, baskets);
  const total = held === null ? 0n : exactTotal(market, held);
  return [...ways.keys()].flatMap((part): LineReason[] => {
    const way = ways[part] as number;
    if (way < 0) return [];
    const cheapest = cheapestWay(market, part, way);
    const moved = ways.with(part, cheapest);
    const plan = weighPlan(market, moved, basketsOf(market, moved));
    return [
      {
        part,
        cheapest: cheapest - (market.first[part] as number),
        dearer: exactOf(market, way) - exactOf(market, cheapest),
        parcels: parcelsOf(market, cheapest, baskets.lines),
        moved: plan === null ? null : exactTotal(market, plan) - total,
      },
    ];
  });
}

/** The open way of least goods; the way taken before others that cost the same. */
function cheapestWay(market: Market, part: number, taken: number): number {
  let [best, least] = [taken, exactOf(market, taken)];
  for (let way = market.first[part] as number; way < (market.first[part + 1] as number); way += 1) {
    if (market.open[way] === 0) continue;
    const goods = exactOf(market, way);
    if (goods < least) [best, least] = [way, goods];
  }
  return best;
}

/** Charges of the parcels a way would open by itself. */
function parcelsOf(market: Market, way: number, lines: Int32Array): bigint {
  const ways = new Int32Array(1).fill(way);
  const alone = basketsOf(market, ways);
  return market.suppliers.reduce((sum, { terms, worth }: MarketSupplier, index) => {
    if (alone.lines[index] === 0 || lines[index] !== 0) return sum;
    const weight = alone.unweighed[index] === 0 ? (alone.weight[index] as number) : null;
    const bill = basketBill(terms, alone.goods[index] as number, weight);
    return sum + convertMinor(bill.total - bill.goods, worth);
  }, 0n);
}
