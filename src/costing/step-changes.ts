import { fromOf } from "./ladder.ts";
import { ordersOf } from "./order-parts.ts";
import type { PreparedOffer, PreparedPlan, PreparedSupplier } from "./prepared-plan.ts";
import type { RunSheet } from "./run-sheet.ts";
import type { Change } from "./sweep-result.ts";

/**
 * What is different between two runs (section 9), most telling first: boards, then parcels and
 * thresholds, then parts in the plan's order. Plain growth, more of the same piece by piece, is no
 * change; one pack more of the same is named as `pack` only where `packs` asks for it, since it makes
 * no kit cheaper.
 */
export function changesBetween(
  prepared: PreparedPlan,
  before: RunSheet,
  after: RunSheet,
  packs: boolean,
): Change[] {
  const changes = boardChanges(before, after);
  for (const supplier of prepared.suppliers) changes.push(...supplierChanges(supplier, before, after));
  for (let index = 0; index < prepared.parts.length; index += 1) {
    if (mayDiffer(before, after, index, packs)) changes.push(...partChanges(prepared, before, after, index));
  }
  return changes;
}

/** Quickly passes over parts of which the same is bought, or more of the same. */
function mayDiffer(before: RunSheet, after: RunSheet, index: number, packs: boolean): boolean {
  const offer = after.chosen[index] ?? null;
  if (offer === null || offer !== before.chosen[index]) return true;
  if (before.quantity[index] === after.quantity[index]) return false;
  const { multiple, model } = offer.ladder;
  return before.tier[index] !== after.tier[index] || model === "lots" || (packs && multiple > 1);
}

function boardChanges(before: RunSheet, after: RunSheet): Change[] {
  const [from, to] = [before.boards, after.boards];
  if (from === null && to === null) return [];
  if (from === null || to === null || from.quote !== to.quote) {
    return [{ what: "board-quote", from: from?.quote.quote.id ?? null, to: to?.quote.quote.id ?? null }];
  }
  const { id: quote, boardsPerPiece } = to.quote.quote;
  if (from.order.tier === to.order.tier) {
    const bySteps = to.quote.ladder?.model === "lots" || boardsPerPiece > 1;
    const [less, more] = [from.order.boards, to.order.boards];
    return bySteps && less !== more ? [{ what: "board-lots", quote, from: less, to: more }] : [];
  }
  const breakOf = (tier: number) =>
    to.quote.ladder === null ? 0 : fromOf(to.quote.ladder, tier) * boardsPerPiece;
  return [{ what: "board-break", quote, from: breakOf(from.order.tier), to: breakOf(to.order.tier) }];
}

function supplierChanges(supplier: PreparedSupplier, before: RunSheet, after: RunSheet): Change[] {
  const { id, index, freeFrom, minimum, fee } = supplier;
  const [had, has] = [before, after].map((sheet) => (sheet.orders[index] as number) > 0);
  if (had !== has) return [{ what: has ? "parcel-more" : "parcel-less", supplier: id }];
  if (!has) return [];
  const changes: Change[] = [];
  const [free, isFree] = [before, after].map((sheet) => (sheet.goods[index] as number) >= freeFrom);
  if (isFree !== undefined && free !== isFree)
    changes.push({ what: "free-freight", supplier: id, reached: isFree });
  const [enough, isEnough] = [before, after].map((sheet) => (sheet.goods[index] as number) >= minimum);
  if (isEnough !== undefined && fee > 0 && enough !== isEnough) {
    changes.push({ what: "minimum-order", supplier: id, reached: isEnough });
  }
  return changes;
}

function partChanges(prepared: PreparedPlan, before: RunSheet, after: RunSheet, index: number): Change[] {
  const part = prepared.parts[index]?.part.id ?? "";
  if (before.splits.has(index) || after.splits.has(index)) {
    const [from, to] = [before, after].map((sheet) => splitName(sheet, index));
    return from === to ? [] : [{ what: "split", part }];
  }
  const [from, to] = [before.chosen[index] ?? null, after.chosen[index] ?? null];
  if (from !== to) return [{ what: "offer", part, from: from?.offer.id ?? null, to: to?.offer.id ?? null }];
  return to === null ? [] : orderChanges(part, to, before, after, index);
}

function orderChanges(
  part: string,
  offer: PreparedOffer,
  before: RunSheet,
  after: RunSheet,
  index: number,
): Change[] {
  const { ladder } = offer;
  const [from, to] = [before.quantity[index] as number, after.quantity[index] as number];
  const at = { part, offer: offer.offer.id };
  if (from === to) return [];
  if (ladder.model === "lots") return [{ what: "lots", ...at, from, to }];
  const [low, high] = [before.tier[index] as number, after.tier[index] as number];
  if (low !== high) return [{ what: "break", ...at, from: fromOf(ladder, low), to: fromOf(ladder, high) }];
  return ladder.multiple > 1 ? [{ what: "pack", ...at, from, to }] : [];
}

function splitName(sheet: RunSheet, index: number): string {
  return JSON.stringify(ordersOf(sheet, index).map(({ offer, order }) => [offer.offer.id, order.tier]));
}
