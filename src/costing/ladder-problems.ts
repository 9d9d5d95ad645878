import { exact } from "./decimal.ts";
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
  const problems: LadderProblem[] = [];
  const { breaks, minimumOrder, orderMultiple, priceModel } = terms;
  const found = (code: LadderProblemCode, at: number, other: number | null = null) =>
    problems.push({ code, refused: code !== "price-rises", at, with: other });
  for (const [at, { quantity, price }] of breaks.entries()) {
    const same = breaks.findIndex((other) => other.quantity === quantity);
    if (same < at) {
      found("quantity-repeats", at, same);
      continue;
    }
    if (priceModel === "lots" && quantity % orderMultiple !== 0) found("lot-not-multiple", at);
    if (priceModel !== "lots" && quantity < minimumOrder) found("break-below-minimum", at);
    const before = breaks[at - 1];
    if (before === undefined) continue;
    if (before.quantity > quantity) found("not-ascending", at, at - 1);
    else if (dearer(priceModel, before, { quantity, price })) found("price-rises", at, at - 1);
  }
  return problems;
}

interface Break {
  quantity: number;
  price: string;
}

/** Lots state a total, so their price per piece is compared. */
function dearer(model: LadderTerms["priceModel"], before: Break, after: Break): boolean {
  if (model !== "lots") return exact(after.price).gt(before.price);
  return exact(after.price).times(before.quantity).gt(exact(before.price).times(after.quantity));
}
