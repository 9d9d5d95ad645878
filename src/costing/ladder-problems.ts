import { grains } from "./grains.ts";
import type { LadderTerms } from "./ladder.ts";

export type LadderProblemCode =
  | "quantity-repeats"
  | "break-below-minimum"
  | "not-ascending"
  | "lot-not-multiple"
  /** Unusual, but some sellers do it: a caution, not a refusal. */
  | "price-rises";

export interface LadderProblem {
  code: LadderProblemCode;
  refused: boolean;
  /** Index of the break, as given, on whose field it shows. */
  at: number;
  /** Index of the other break of a pair. */
  with: number | null;
}

/**
 * What is wrong with a ladder as it stands (section 1.6): quantities that repeat or do not ascend, a
 * break below the minimum order, lots that are no multiple of the order multiple. A price
 * per piece that rises with quantity is only a caution. An empty list: nothing.
 *
 * @example breaks 1, 10, 10 → [{ code: "quantity-repeats", refused: true, at: 2, with: 1 }]
 */
export function ladderProblems(terms: Omit<LadderTerms, "currency">): LadderProblem[] {
  const { breaks, priceModel } = terms;
  const rises = breaks.flatMap((step, at): LadderProblem[] => {
    const before = breaks[at - 1];
    const rising =
      before !== undefined && before.quantity < step.quantity && dearer(priceModel, before, step);
    return rising ? [{ code: "price-rises", refused: false, at, with: at - 1 }] : [];
  });
  return [...quantityProblems(terms), ...rises].sort((a, b) => a.at - b.at);
}

/** Those that are refused: what is wrong with the quantities. */
export function quantityProblems(terms: Omit<LadderTerms, "currency">): LadderProblem[] {
  const problems: LadderProblem[] = [];
  const { breaks, minimumOrder, orderMultiple, priceModel } = terms;
  const first = new Map<number, number>();
  for (let at = 0; at < breaks.length; at += 1) {
    const { quantity } = breaks[at] as Break;
    const same = first.get(quantity);
    if (same !== undefined) {
      problems.push(refused("quantity-repeats", at, same));
      continue;
    }
    first.set(quantity, at);
    if (priceModel === "lots" && quantity % orderMultiple !== 0)
      problems.push(refused("lot-not-multiple", at));
    if (priceModel !== "lots" && quantity < minimumOrder) problems.push(refused("break-below-minimum", at));
    if ((breaks[at - 1]?.quantity ?? 0) > quantity) problems.push(refused("not-ascending", at, at - 1));
  }
  return problems;
}

function refused(code: LadderProblemCode, at: number, other: number | null = null): LadderProblem {
  return { code, refused: true, at, with: other };
}

type Break = LadderTerms["breaks"][number];

/** Lots state a total, so their price per piece is compared. */
function dearer(model: LadderTerms["priceModel"], before: Break, after: Break): boolean {
  const [first, second] = [grains(before.price), grains(after.price)];
  if (model !== "lots") return second > first;
  return second * BigInt(before.quantity) > first * BigInt(after.quantity);
}
