import type { Figure } from "./figure.ts";
import { grainText } from "./grains.ts";
import type { Need, SourcePage } from "./problem.ts";
import { divideDown } from "./whole.ts";
import type { FigureId, WorkingAmount, WorkingLine, WorkingSource, WorkingTree } from "./working-tree.ts";

/** The parts a working is built from: lines before they get their letters. */
export type Step = Omit<WorkingLine, "letter">;
export type Sign = WorkingLine["sign"];

/** Whatever a step may leave at its usual value. */
type Extras = Partial<Pick<Step, "subs" | "source" | "opens" | "result" | "rounds">>;

/** A line: sign, label, amount and the section it follows; the rest at its usual value. */
export function step(
  sign: Sign,
  label: string,
  amount: WorkingAmount | null,
  rule: string,
  extras: Extras = {},
): Step {
  return {
    sign,
    label,
    amount,
    rule,
    subs: [],
    source: null,
    opens: null,
    result: false,
    rounds: null,
    ...extras,
  };
}

/** Money in a currency from grains, decimal text, or a figure that may not be known. */
export function money(value: bigint | string | Figure, currency: string, places?: number): WorkingAmount {
  if (typeof value === "object" && !value.known) return { kind: "not-known", needs: value.needs };
  const text = typeof value === "bigint" ? grainText(value) : typeof value === "string" ? value : value.value;
  return places === undefined
    ? { kind: "money", value: text, currency }
    : { kind: "money", value: text, currency, places };
}

/** A whole number of things: pieces, kits, boards. */
export function count(value: number | string, unit: string): WorkingAmount {
  return { kind: "count", value: value.toString(), unit };
}

/** A share or rate as a decimal. */
export function rate(value: string): WorkingAmount {
  return { kind: "rate", value };
}

/** A number with its unit, where it is neither money nor a count. */
export function number(value: string, unit = ""): WorkingAmount {
  return { kind: "number", value, unit };
}

/** An amount that is told in words: why an offer is not taken. */
export function words(value: string): WorkingAmount {
  return { kind: "words", value };
}

/** In place of an amount: what it needs. */
export function notKnown(needs: Need[]): WorkingAmount {
  return { kind: "not-known", needs };
}

/** The page, and the thing on it, whose field an amount comes from. */
export function from(page: SourcePage, id: string | null = null): WorkingSource {
  return { page, id };
}

/** Steps of a sum: the first without sign, the others added; left out where there is nothing to add. */
export function summed(steps: readonly Step[]): Step[] {
  return steps.map((one, index) => ({ ...one, sign: index === 0 ? null : (one.sign ?? "+") }));
}

/** Letters a, b, c … for lines that have an amount: z is followed by aa. */
export function lettered(steps: readonly Step[]): WorkingLine[] {
  let place = 0;
  return steps.map((one) => {
    if (one.amount === null) return { ...one, letter: null };
    place += 1;
    return { ...one, letter: letterOf(place) };
  });
}

function letterOf(place: number): string {
  let rest = place;
  let letters = "";
  while (rest > 0) {
    rest -= 1;
    letters = String.fromCharCode(97 + (rest % 26)) + letters;
    rest = divideDown(rest, 26);
  }
  return letters;
}

/** What a working says besides its lines. */
export interface Sheet {
  title: string;
  steps: Step[];
  notes: string[];
  basis?: string;
}

/** A finished working from its steps and the facts of the run. */
export function treeOf(
  figure: FigureId,
  sheet: Sheet,
  facts: { currency: string; kits: number; revision: string; pricedOn: string | null },
): WorkingTree {
  return {
    figure,
    title: sheet.title,
    basis: sheet.basis ?? `In ${facts.currency}, without VAT`,
    kits: facts.kits,
    lines: lettered(sheet.steps),
    notes: sheet.notes,
    revision: facts.revision,
    pricedOn: facts.pricedOn,
  };
}
