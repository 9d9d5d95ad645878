import type { Facts, Question } from "./draft.ts";
import type { PriceProblem } from "./read-offers.ts";
import { type Answers, ask, type RowWork } from "./row-work.ts";

/** Asks how a price cell is meant that is no plain price; one that cannot be read at all can only be left out. */
export function askAboutPrice(work: RowWork, problem: PriceProblem, answers: Answers): Question {
  const { text, per, column } = problem;
  const facts: Facts =
    per === null
      ? { text }
      : { text, amount: per.amount, per: per.per, each: per.each, currency: per.currency };
  const choices = per === null ? ["leave-price-out"] : ["read-from", "read-for", "leave-price-out"];
  return ask(
    work,
    { code: "price-unclear", level: per === null ? "look" : "must", columns: [column], facts, choices },
    answers,
  );
}
