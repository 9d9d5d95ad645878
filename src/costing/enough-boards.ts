import { exact } from "./decimal.ts";

/**
 * Chance that at least `required` of `ordered` boards are good, each with chance `yieldShare` (section 6):
 * the upper tail of Binomial(ordered, yield), summed exactly from the fewest faulty boards on. Text of 0 to 1
 * with 6 decimals, halves up.
 *
 * @example enoughGood(20, 21, "0.95") === "0.716972" (0.95^20 × (1 + 20 × 0.05))
 */
export function enoughGood(required: number, ordered: number, yieldShare: string): string {
  if (ordered < required) return "0";
  const good = exact(yieldShare);
  const faulty = exact(1).minus(good);
  let term = good.pow(required);
  let sum = term;
  for (let extra = 1; extra <= ordered - required; extra += 1) {
    term = term
      .times(faulty)
      .times(required + extra - 1)
      .div(extra);
    sum = sum.plus(term);
  }
  return sum.toDecimalPlaces(6).toFixed();
}
