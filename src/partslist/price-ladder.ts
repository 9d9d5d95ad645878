import type { ReadPrice } from "./draft.ts";
import { compareDecimals } from "./exact-decimal.ts";

export type LadderProblem =
  | { code: "ladder-not-rising"; quantity: number; first: string; second: string }
  | { code: "price-rises"; quantity: number; before: string; after: string };

/** Breaks in rising order, the same break given twice at the same price taken once; and the first thing wrong with them. */
export function checkLadder(prices: readonly ReadPrice[]): {
  breaks: ReadPrice[];
  problem: LadderProblem | null;
} {
  const sorted = [...prices].sort((a, b) => a.quantity - b.quantity);
  const breaks: ReadPrice[] = [];
  let problem: LadderProblem | null = null;
  for (const price of sorted) {
    const before = breaks.at(-1);
    if (before?.quantity === price.quantity) {
      if (compareDecimals(before.amount, price.amount) === 0) continue;
      problem ??= {
        code: "ladder-not-rising",
        quantity: price.quantity,
        first: before.amount,
        second: price.amount,
      };
    } else if (before && compareDecimals(price.amount, before.amount) > 0)
      problem ??= {
        code: "price-rises",
        quantity: price.quantity,
        before: before.amount,
        after: price.amount,
      };
    breaks.push(price);
  }
  return { breaks, problem };
}

/** The ladder after the answer to its problem. */
export function mendLadder(
  breaks: readonly ReadPrice[],
  problem: LadderProblem,
  choice: string,
): ReadPrice[] {
  if (choice === "drop-step") return breaks.filter((price) => price.quantity !== problem.quantity);
  if (choice !== "keep-lower" && choice !== "keep-higher") return [...breaks];
  const same = breaks
    .filter((price) => price.quantity === problem.quantity)
    .sort((a, b) => compareDecimals(a.amount, b.amount));
  const kept = choice === "keep-lower" ? same[0] : same.at(-1);
  return breaks.filter((price) => price.quantity !== problem.quantity || price === kept);
}
