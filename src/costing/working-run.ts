import { headSpent } from "./head-results.ts";
import type { SourcePage } from "./problem.ts";
import { HEADS, type HeadId, type RunResult } from "./run-result.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, type Sheet, type Step, step, summed } from "./working-lines.ts";

/** Names of the heads as lines call them, and the page whose inputs make them up. */
export const HEAD_NAMES: Record<HeadId, { name: string; page: SourcePage }> = {
  boards: { name: "Boards", page: "boards" },
  parts: { name: "Parts", page: "offers" },
  freight: { name: "Freight and duty", page: "offers" },
  packing: { name: "Packing material", page: "run" },
  work: { name: "Work, programming and test", page: "run" },
  "one-off": { name: "One-off charges", page: "run" },
  replacements: { name: "Replacements", page: "run" },
};

/** How rounding is said once on papers of sums. */
export const EXACT = "Every line is exact; only what a supplier charges is rounded, to the cent, halves up.";

/** The heads as a sum that ends in what is spent; heads that cost nothing are left out. */
export function spentSteps({ result, sheet }: WorkingContext, isResult: boolean): Step[] {
  const { currency } = result;
  const heads = HEADS.filter((id) => {
    const head = result.heads.find((one) => one.id === id);
    return headSpent(sheet, id) !== 0n || head?.spent.known === false;
  });
  const lines = (heads.length > 0 ? heads : HEADS.slice(0, 1)).map((id) => {
    const { name, page } = HEAD_NAMES[id];
    const spent = result.heads.find((one) => one.id === id)?.spent ?? result.spent;
    return step("+", name, money(spent, currency), "8", { opens: `head:${id}`, source: from(page) });
  });
  const opens = isResult ? null : "spent";
  const total = step("=", "Spent on the run", money(result.spent, currency), "8", {
    result: isResult,
    opens,
  });
  return [...summed(lines), total];
}

/** All the money the run needs, by head (section 8). */
export function spentSheet(context: WorkingContext): Sheet {
  return {
    title: `Spent on a run of ${context.result.kits}`,
    steps: spentSteps(context, true),
    notes: [EXACT, ...workNote(context.result)],
  };
}

/** Spent counts own work at its rate, which is no money out of hand. */
function workNote({ work }: RunResult): string[] {
  const counted = work.cost.known && work.cost.value !== "0";
  return counted ? ["Own work counts at its rate, though that money need not be at hand."] : [];
}

function usedSteps(context: WorkingContext, isResult: boolean): Step[] {
  const { result } = context;
  const { currency } = result;
  return [
    ...spentSteps(context, false),
    step("−", "What keeps on the shelf", money(result.keptOnShelf, currency), "8", { opens: "left-over" }),
    step("+", "Stock taken from the shelf, at its book cost", money(result.stockTaken, currency), "8", {
      source: from("parts"),
    }),
    step("=", "Used by the run", money(result.used, currency), "8", {
      result: isResult,
      opens: isResult ? null : "used",
    }),
  ];
}

/** Spent, less what keeps on the shelf, with stock taken from it (section 8). */
export function usedSheet(context: WorkingContext): Sheet {
  return {
    title: `Used by a run of ${context.result.kits}`,
    steps: usedSteps(context, true),
    notes: [EXACT],
  };
}

/** Cost per kit in either view: the heads, the run, and its kits (section 8). */
export function perKitSheet(context: WorkingContext, view: "spent" | "used"): Sheet {
  const { result } = context;
  const { currency, kits } = result;
  const above = view === "spent" ? spentSteps(context, false) : usedSteps(context, false);
  return {
    title: `Cost per kit at a run of ${kits}`,
    steps: [
      ...above,
      step("÷", "Kits in the run", count(kits, "kits"), "8", { source: from("run") }),
      step(
        "=",
        view === "used" ? "Cost per kit" : "Cash needed per kit",
        money(result.perKit[view], currency),
        "8",
        {
          result: true,
        },
      ),
    ],
    notes: [EXACT, "The quotient is carried exactly and written to the nearest cent."],
  };
}

/** What is left of each part, and what of it keeps. */
export function leftOverSheet({ result, prepared }: WorkingContext): Sheet {
  const { currency } = result;
  const left = result.parts.filter(({ leftOver }) => leftOver > 0);
  const keeping = left.filter(({ keptOnShelf }) => keptOnShelf.known && keptOnShelf.value !== "0");
  const shareOf = (id: string) => prepared.parts.find(({ part }) => part.id === id)?.part.keepShare ?? "0";
  const line = (name: string, amount: Step["amount"], id: string) =>
    step("+", name, amount, "8", { opens: `part:${id}`, source: from("offers", id) });
  return {
    title: `Left over after a run of ${result.kits}`,
    steps: [
      ...summed(
        left.map((part) =>
          line(`${part.name}, ${part.leftOver} left`, money(part.leftOverValue, currency), part.id),
        ),
      ),
      step(left.length === 0 ? null : "=", "Worth, at the price paid", money(result.leftOver, currency), "8"),
      ...summed(
        keeping.map((part) =>
          line(
            `${part.name}, keeps ${percent(shareOf(part.id))}`,
            money(part.keptOnShelf, currency),
            part.id,
          ),
        ),
      ),
      step(
        keeping.length === 0 ? null : "=",
        "Keeps on the shelf",
        money(result.keptOnShelf, currency),
        "8",
        { result: true },
      ),
    ],
    notes: ["A piece left over is worth the price of the break it was bought at; freight is not counted in."],
  };
}

/**
 * A share as whole and part of a hundred: "0.5" is "50 %".
 *
 * @example percent("0.025") is "2.5 %" with a no-break space
 */
export function percent(share: string): string {
  const [whole = "0", fraction = ""] = share.split(".");
  const digits = `${whole}${fraction.padEnd(2, "0").slice(0, 2)}`.replace(/^0+(?=\d)/, "");
  const rest = fraction.slice(2).replace(/0+$/, "");
  return `${digits}${rest === "" ? "" : `.${rest}`}\u00a0%`;
}
