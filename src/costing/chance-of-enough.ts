import { exact } from "./decimal.ts";

/**
 * P(good ≥ required) of `boards` boards, good ~ Binomial(boards, yield), to 40 significant digits:
 * the terms from all good downward. For showing beside the boards to order; the decision itself is
 * `boardsToOrder`.
 *
 * @example chanceOfEnough(20, 23, "0.95") → "0.968…"
 */
export function chanceOfEnough(required: number, boards: number, yieldShare: string): string {
  const good = exact(yieldShare);
  if (boards < required) return "0";
  if (good.isZero()) return required === 0 ? "1" : "0";
  const odds = exact(1).minus(good).div(good);
  let term = good.pow(boards);
  let sum = exact(0);
  for (let faulty = 0; faulty <= boards - required; faulty += 1) {
    sum = sum.plus(term);
    term = term
      .times(odds)
      .times(boards - faulty)
      .div(faulty + 1);
  }
  return sum.toFixed();
}
