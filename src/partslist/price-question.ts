import type { Facts, Question, ReadPrice } from "./draft.ts";
import { compareDecimals } from "./exact-decimal.ts";
import type { PriceProblem } from "./read-offers.ts";
import { type Answers, ask, type RowWork } from "./row-work.ts";

/**
 * Whether "4,50/100" is more likely 4,50 for a hundred than 4,50 each: it is where it would otherwise be
 * dearer than a price for fewer, or where the heading already says from how many the price holds.
 */
function isForAll(
  per: NonNullable<PriceProblem["per"]>,
  others: readonly ReadPrice[],
  quantity: number,
): boolean {
  if (quantity === per.per) return true;
  return others.some((price) => price.quantity <= per.per && compareDecimals(per.amount, price.amount) > 0);
}

/** Asks how a price cell is meant that is no plain price; one that cannot be read at all can only be left out. */
export function askAboutPrice(
  work: RowWork,
  problem: PriceProblem,
  others: readonly ReadPrice[],
  answers: Answers,
): Question {
  const { text, per, column } = problem;
  const facts: Facts =
    per === null
      ? { text }
      : { text, amount: per.amount, per: per.per, each: per.each, currency: per.currency };
  const readings =
    per !== null && isForAll(per, others, problem.quantity)
      ? ["read-for", "read-from"]
      : ["read-from", "read-for"];
  const choices = [...(per === null ? [] : readings), "leave-price-out"];
  return ask(
    work,
    { code: "price-unclear", level: per === null ? "look" : "must", columns: [column], facts, choices },
    answers,
  );
}
