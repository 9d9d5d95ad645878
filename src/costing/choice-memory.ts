import { fromOf, type Ladder, type Rung } from "./ladder.ts";
import type { PreparedOffer } from "./prepared-plan.ts";
import type { WeighedOffer } from "./supplier-choice.ts";

/**
 * What the last choice for a part tells about the next one. From one run size to the next quantities
 * grow a little, and most offers stay too dear for many sizes: floors say how dear at least, so that
 * they are passed over without being weighed again. A floor is never part of a figure.
 */
export interface ChoiceMemory {
  /** The last choice and the quantity it was made for; written over by the next choice. */
  best: WeighedOffer | null;
  quantity: number;
  /** One that may be written over. */
  spare: WeighedOffer | null;
  /** By rank of the offer. */
  floors: Floor[];
  /** The least floor of all but the winner when they were last looked at, and the quantity of that. */
  rivals: number;
  rivalsFrom: number;
}

/** For every quantity ≥ `from` an offer alone is worth at least `min(most, base + perPiece × quantity)`, in grains. */
export interface Floor {
  from: number;
  base: number;
  perPiece: number;
  most: number;
}

/** A memory of nothing yet. */
export function emptyMemory(offers: number): ChoiceMemory {
  const floors = Array.from({ length: offers }, noFloor);
  return { best: null, quantity: 0, spare: null, floors, rivals: 0, rivalsFrom: Number.POSITIVE_INFINITY };
}

function noFloor(): Floor {
  return { from: Number.POSITIVE_INFINITY, base: 0, perPiece: 0, most: 0 };
}

/** What no order for so many pieces or more is worth less than; 0 where nothing is known. */
export function floorAt(floor: Floor, quantity: number): number {
  if (quantity < floor.from) return 0;
  return Math.min(floor.most, floor.base + floor.perPiece * quantity);
}

/**
 * Whether an offer is plainly worth less than a floor, with a billionth of margin for the rounding of
 * the comparison.
 *
 * @example alone 6690 cents, floor 7000 cents: true
 */
export function isBelow({ alone, offer }: WeighedOffer, floor: number): boolean {
  return alone * offer.worth.near < floor * (1 - 1e-9);
}

/**
 * Sets an offer's floor from what it costs at a quantity; null: it cannot cover it, nor any larger.
 * The goods of more pieces never cost less, and on the break that the quantity itself reaches they
 * grow by the price of a piece (less half a minor unit of rounding) until an order on a higher break
 * costs less. Freight is added while the goods stay below the value from which it is free.
 */
export function setFloor(
  floor: Floor,
  offer: PreparedOffer,
  quantity: number,
  weighed: WeighedOffer | null,
): void {
  const { near } = offer.worth;
  const { freight, freeFrom } = offer.supplier;
  floor.from = quantity;
  floor.perPiece = 0;
  floor.most = Number.POSITIVE_INFINITY;
  if (weighed === null) {
    floor.base = Number.POSITIVE_INFINITY;
    return;
  }
  const { cost, tier } = weighed.order;
  const isFree = cost >= freeFrom;
  const paid = isFree ? 0 : (freight ?? 0);
  if (!isFree) floor.most = freeFrom * near;
  if (isOnOwnBreak(offer.ladder, tier, quantity)) {
    const { millionths, higher } = offer.ladder.rungs[tier] as Rung;
    floor.base = (paid - 0.5) * near;
    floor.perPiece = (millionths / offer.ladder.divisor) * near;
    if (higher !== null) floor.most = Math.min(floor.most, (higher.cost + paid) * near);
  } else floor.base = (cost + paid) * near;
}

function isOnOwnBreak(ladder: Ladder, tier: number, quantity: number): boolean {
  return ladder.model === "whole-order" && fromOf(ladder, tier) <= quantity;
}

/** The least floor at a quantity among all but the winner; it holds for larger quantities as well. */
export function leastRival({ floors }: ChoiceMemory, quantity: number, winner: number | undefined): number {
  let least = Number.POSITIVE_INFINITY;
  for (let rank = 0; rank < floors.length; rank += 1) {
    if (rank !== winner) least = Math.min(least, floorAt(floors[rank] as Floor, quantity));
  }
  return least;
}
