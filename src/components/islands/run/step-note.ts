import { moneyText } from "#src/components/amount-text.ts";
import type { SweepResult } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { changesInWords } from "./change-words.ts";

/** What a chart says at a step of its line. */
export interface StepNote {
  /** The run size where the line goes on after the step. */
  kits: number;
  title: string;
  reason: string;
}

const ORDINALS: Record<string, string> = { one: "st", two: "nd", few: "rd", other: "th" };
const ordinalRules = new Intl.PluralRules("en", { type: "ordinal" });

/** "121st" */
export function ordinal(whole: number): string {
  return `${whole}${ORDINALS[ordinalRules.select(whole)] ?? "th"}`;
}

/** The first step of the cost per kit at the run or after it, up or down, in words; null where there is none up to `end`. */
export function stepNote(plan: Plan, sweep: SweepResult, run: number, end: number): StepNote | null {
  const { currency } = sweep;
  const ups = sweep.sweetSpots.map(({ kits, nextKit, changes }) => ({
    kits: kits + 1,
    changes,
    title: `The ${ordinal(kits + 1)} kit costs ${moneyText(nextKit, currency)}`,
  }));
  const downs = sweep.stepDowns.map(({ kits, fellBy, changes }) => ({
    kits,
    changes,
    title: `From ${kits} each costs ${moneyText(fellBy, currency)} less`,
  }));
  const [first] = [...ups, ...downs]
    .filter(({ kits }) => kits > run && kits <= end)
    .sort((one, other) => one.kits - other.kits);
  if (!first) return null;
  const reason = changesInWords(plan, first.changes);
  return {
    kits: first.kits,
    title: reason === "" ? `${first.title}.` : `${first.title}:`,
    reason: reason === "" ? "" : `${reason}.`,
  };
}
