import type { BreakEven } from "#src/costing/sweep-result.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { asSentence, changesInWords } from "./change-words.ts";
import { crossingLetter } from "./even-shapes.ts";

export interface CrossingWords {
  letter: string;
  kits: number;
  words: string;
}

/** Each crossing with its letter, and what happens there. */
export function crossingWords(plan: Plan, { crossings, first, safe }: BreakEven): CrossingWords[] {
  return crossings.map(({ kits, way, changes }, place) => {
    const reason = asSentence(changesInWords(plan, changes, 1));
    const what =
      way === "down"
        ? `Back at a loss. ${reason}`
        : kits === safe
          ? kits === first
            ? "Takings pass cost, and stay above it from here on."
            : "Ahead again, and from here on."
          : kits === first
            ? "Takings first pass cost."
            : "Ahead again.";
    return { letter: crossingLetter(place), kits, words: what.trim() };
  });
}

/** First and safe break-even in one sentence. */
export function breakEvenWords({ known, first, safe, upTo }: BreakEven): string {
  if (!known) return "Not known while cost or takings of some run size are not known.";
  if (first === null) return `No run up to ${upTo} pays for itself.`;
  if (safe === null)
    return `From ${first} kits on a run can pay for itself, but none does for good up to ${upTo}.`;
  if (first === safe) return `From ${first} kits on every run pays for itself, if all are sold.`;
  return `A run of ${first} is the first that pays for itself; from ${safe} kits on every run does, if all are sold.`;
}
