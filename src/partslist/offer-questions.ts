import type { Question } from "./draft.ts";
import { type Match, matchPart, type PartIndex } from "./match-part.ts";
import type { PriceDraft } from "./price-draft.ts";
import { checkLadder, mendLadder } from "./price-ladder.ts";
import { askAboutPrice } from "./price-question.ts";
import type { PriceProblem } from "./read-offers.ts";
import { type Answers, ask, type RowWork } from "./row-work.ts";

/** The choice that holds for a question: the answer, else the suggestion. */
function choiceOf(question: Question): string {
  return question.answer ?? question.suggested.choice;
}

export function askPrice(
  work: RowWork,
  problem: PriceProblem | undefined,
  offer: PriceDraft,
  answers: Answers,
): string | null {
  if (problem === undefined) {
    if (offer.breaks.length > 0) return null;
    return choiceOf(
      ask(
        work,
        {
          code: "price-missing",
          level: "look",
          columns: [],
          facts: {},
          choices: ["keep-offer", "leave-row-out"],
        },
        answers,
      ),
    );
  }
  const { per } = problem;
  const choice = choiceOf(askAboutPrice(work, problem, offer.breaks, answers));
  if (per !== null && choice !== "leave-price-out")
    offer.breaks.push({
      quantity: per.per,
      amount: choice === "read-from" ? per.amount : per.each,
      currency: per.currency ?? offer.currency,
    });
  return choice;
}

export function askLadder(work: RowWork, offer: PriceDraft, answers: Answers): string | null {
  const { breaks, problem } = checkLadder(offer.breaks);
  offer.breaks = breaks;
  if (problem === null) return null;
  const { code, ...facts } = problem;
  const must = code === "ladder-not-rising";
  const choices = must
    ? ["keep-lower", "keep-higher", "leave-row-out"]
    : ["keep-prices", "drop-step", "leave-row-out"];
  const choice = choiceOf(
    ask(
      work,
      {
        code,
        level: must ? "must" : "look",
        columns: [],
        facts: { ...facts, currency: offer.currency },
        choices,
      },
      answers,
    ),
  );
  offer.breaks = mendLadder(breaks, problem, choice);
  return choice;
}

/** A person may name any part of the workshop, not only those offered: `take-part:<id>`. */
export function askPart(work: RowWork, offer: PriceDraft, index: PartIndex, answers: Answers): string | null {
  const match = matchPart(offer, index);
  if (match.kind === "one") {
    offer.part = match.part.id;
    offer.matchedBy = match.by;
    return null;
  }
  const question = askWhichPart(work, offer, match, index, answers);
  const id = choiceOf(question).replace(/^take-part:/, "");
  if (!index.byId.has(id)) return choiceOf(question);
  offer.part = id;
  offer.matchedBy = "answer";
  return null;
}

function askWhichPart(
  work: RowWork,
  offer: PriceDraft,
  match: Match & { kind: "several" | "none" },
  index: PartIndex,
  answers: Answers,
): Question {
  const offered = match.kind === "several" ? match.parts : match.near;
  const code = match.kind === "several" ? "part-found-twice" : "part-not-found";
  const given = answers.get(`${work.record.row} ${code}`)?.choice ?? "";
  const named = index.byId.get(given.replace(/^take-part:/, ""));
  const parts = named && !offered.includes(named) ? [...offered, named] : offered;
  const facts = {
    text:
      [offer.orderCode, offer.partNumber, offer.value, offer.description].find((text) => text !== null) ?? "",
    names: parts.map((part) => part.name),
  };
  const choices = ["leave-row-out", ...parts.map((part) => `take-part:${part.id}`)];
  const question = ask(work, { code, level: "look", columns: [], facts, choices }, answers);
  question.alternatives = question.alternatives.map((choice) => ({
    choice: choice.choice,
    facts: { name: index.byId.get(choice.choice.replace(/^take-part:/, ""))?.name ?? "" },
  }));
  return question;
}
