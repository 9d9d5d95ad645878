import { countText, moneyText } from "#src/components/amount-text.ts";
import type { Figure } from "#src/costing/figure.ts";
import type { SourcePage } from "#src/costing/problem.ts";
import { needWords } from "#src/costing/problem-words.ts";
import type { RunResult } from "#src/costing/run-result.ts";

/** A piece of the answer; deciding figures are bold, and what is to be done leads to its page. */
export interface AnswerPiece {
  text: string;
  bold?: boolean;
  page?: SourcePage;
}

/** The figures of a run that its answer is made of. */
export interface AnswerFigures {
  kits: number;
  currency: string;
  costPerKit: Figure;
  bringsPerKit: Figure;
  earnsPerKit: Figure;
  evenAfter: Figure;
  spent: Figure;
}

/** The figures of the answer from a run. */
export function answerFigures(run: RunResult): AnswerFigures {
  return {
    kits: run.kits,
    currency: run.currency,
    costPerKit: run.perKit.used,
    bringsPerKit: run.bringsPerKit,
    earnsPerKit: run.earnsPerKit,
    evenAfter: run.evenAfter,
    spent: run.spent,
  };
}

const bold = (text: string): AnswerPiece => ({ text, bold: true });
const plain = (text: string): AnswerPiece => ({ text });

function positive(amount: string): string {
  return amount.startsWith("-") ? amount.slice(1) : amount;
}

/**
 * The answer of the run page from the figures of the run, pieces to be set one after the other: what a kit
 * costs, brings in and earns, when the run is paid for, and what it needs in cash.
 */
export function runAnswer(figures: AnswerFigures): AnswerPiece[] {
  const { kits, costPerKit, bringsPerKit, earnsPerKit, evenAfter, spent, currency } = figures;
  const write = (amount: string) => moneyText(amount, currency);
  if (!costPerKit.known && costPerKit.needs.some(({ code }) => code === "no-parts"))
    return [
      bold("There are no parts yet."),
      plain(" What a kit costs is known once there is a list: "),
      { text: "bring in a parts list", page: "parts" },
      plain("."),
    ];
  if (!costPerKit.known)
    return [bold(`${kits} cannot be worked out yet.`), plain(` The cost ${needWords(costPerKit.needs)}.`)];
  const cost = `One kit costs ${write(costPerKit.value)}`;
  if (!bringsPerKit.known || !earnsPerKit.known)
    return [
      bold(
        `${kits} ${kits === 1 ? "kit costs" : "kits cost"} ${spent.known ? write(spent.value) : "more than is known"}.`,
      ),
      plain(` ${cost}. What it brings in ${needWords(bringsPerKit.known ? [] : bringsPerKit.needs)}.`),
    ];
  const brings = `${cost} and brings in ${write(bringsPerKit.value)}`;
  const earns = earnsPerKit.value;
  if (earns.startsWith("-"))
    return [
      bold(`A run of ${kits} loses money.`),
      plain(` ${brings}, so each loses `),
      bold(write(positive(earns))),
      plain(" even if all are sold."),
    ];
  const cash = spent.known ? ` It needs ${write(spent.value)} in cash.` : "";
  return [
    bold(`Make ${kits}.`),
    plain(` ${brings}, so each earns `),
    bold(write(earns)),
    plain(
      evenAfter.known ? `. The run is paid for after ${countText(evenAfter.value)} sold.${cash}` : `.${cash}`,
    ),
  ];
}
