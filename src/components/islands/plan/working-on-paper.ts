import {
  countText,
  moneyText,
  plainMoneyText,
  rateText,
  unitPriceText,
} from "#src/components/amount-text.ts";
import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { methodLinks } from "#src/components/method-links.ts";
import type { Paper, PaperLine, PaperSub } from "#src/components/working-paper.ts";
import { dayWords } from "#src/costing/day-words.ts";
import { needWords } from "#src/costing/problem-words.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import type {
  FigureId,
  WorkingAmount,
  WorkingLine,
  WorkingSource,
  WorkingSub,
  WorkingTree,
} from "#src/costing/working-tree.ts";
import { pageLink } from "./page-links.ts";

export interface PaperContext {
  /** The kit whose pages the amounts come from; `null`: they lead nowhere. */
  address: KitAddress | null;
  currency: string;
  /** "14:32"; `null` where it was not worked out for anybody in particular. */
  time: string | null;
  /** Opens another figure from a line; `null`: none opens. */
  open: ((figure: FigureId) => void) | null;
}

/** Decimals of a plain number such as hours or a learning factor. */
const NUMBER_PLACES = 4;

function trimmed(value: string): string {
  const rounded = roundedText(value, NUMBER_PLACES);
  return rounded.replace(/\.?0+$/, "");
}

function written(amount: WorkingAmount, currency: string): string {
  switch (amount.kind) {
    case "money":
      if (amount.places !== undefined) return unitPriceText(amount.value, amount.currency);
      return amount.currency === currency
        ? plainMoneyText(amount.value, currency)
        : moneyText(amount.value, amount.currency);
    case "count":
      return amount.unit ? `${countText(amount.value)} ${amount.unit}` : countText(amount.value);
    case "rate":
      return rateText(amount.value);
    case "number":
      return amount.unit ? `${trimmed(amount.value)} ${amount.unit}` : trimmed(amount.value);
    case "words":
      return amount.value;
    case "not-known":
      return needWords(amount.needs);
  }
}

function source(from: WorkingSource | null, { address }: PaperContext) {
  return from && address ? pageLink(address, from.page) : undefined;
}

const opener = (opens: FigureId | null, { open }: PaperContext) =>
  opens && open ? () => open(opens) : undefined;

function paperSub(sub: WorkingSub, context: PaperContext): PaperSub {
  return {
    label: sub.label,
    amount: written(sub.amount, context.currency),
    source: source(sub.source, context),
    onOpen: opener(sub.opens, context),
  };
}

function paperLine(line: WorkingLine, before: WorkingLine | undefined, context: PaperContext): PaperLine {
  return {
    letter: line.letter ?? undefined,
    label: line.label,
    sign: line.sign ?? undefined,
    amount: line.amount ? written(line.amount, context.currency) : undefined,
    subs: line.subs.map((sub) => paperSub(sub, context)),
    source: source(line.source, context),
    onOpen: opener(line.opens, context),
    result: line.result,
    apart: before?.sign === "=" && line.sign === null,
  };
}

/** A working as it is written on squared paper. */
export function workingOnPaper(tree: WorkingTree, context: PaperContext): Paper {
  const from = [
    tree.revision && `rev ${tree.revision}`,
    tree.pricedOn && `the prices of ${dayWords(tree.pricedOn)}`,
  ].filter(Boolean);
  return {
    of: tree.title,
    basis: tree.basis,
    lines: tree.lines.map((line, place) => paperLine(line, tree.lines[place - 1], context)),
    notes: tree.notes,
    methods: methodLinks(tree.lines.map(({ rule }) => rule)),
    foot: `Worked ${[context.time && `at ${context.time}`, from.length > 0 && `from ${from.join(" and ")}`].filter(Boolean).join(" ")}.`,
  };
}
