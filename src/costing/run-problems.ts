import { minorText } from "./money.ts";
import type { PreparedPlan } from "./prepared-plan.ts";
import { NEED_CODES, type Problem, type ProblemFacts } from "./problem.ts";
import { needsOf } from "./run-needs.ts";
import { BRINGS_NEEDS, type RunSheet, SHORT, USED_NEEDS } from "./run-sheet.ts";
import { coverableOf } from "./split-order.ts";

/**
 * Everything about a run that is missing or worth knowing: first what figures wait for, then
 * cautions; within each, in the order of the code list, then of the plan.
 */
export function runProblems(prepared: PreparedPlan, sheet: RunSheet): Problem[] {
  const missing = needsOf(prepared, sheet, USED_NEEDS | BRINGS_NEEDS).flatMap(({ code, at }) =>
    at.map((place): Problem => ({ code, at: place, facts: factsOf(prepared, sheet, code, place) })),
  );
  const waiting = new Set<string>(missing.map(({ code }) => code));
  const order = (code: string) => (NEED_CODES as readonly string[]).indexOf(code);
  missing.sort((a, b) => order(a.code) - order(b.code));
  const cautions = [...prepared.problems, ...basketCautions(prepared, sheet), ...quoteCautions(prepared)];
  return [...missing, ...cautions.filter(({ code }) => code !== "no-rate" || !waiting.has(code))];
}

function factsOf(
  prepared: PreparedPlan,
  sheet: RunSheet,
  code: Problem["code"],
  at: Problem["at"],
): ProblemFacts {
  const index = prepared.parts.findIndex(({ part }) => part.id === at.part);
  const part = prepared.parts[index];
  if (code === "short-part" && part !== undefined && sheet.state[index] === SHORT) {
    return { by: (sheet.toBuy[index] as number) - coverableOf(part, sheet.barred) };
  }
  const supplier = prepared.suppliers.find(({ id }) => id === at.supplier);
  if (code === "order-refused" && supplier !== undefined)
    return lacking(supplier, sheet.barred.get(supplier.index) ?? 0);
  return {};
}

/** What a basket lacks to its supplier's minimum order value. */
function lacking({ minimum, terms }: PreparedPlan["suppliers"][number], goods: number): ProblemFacts {
  return { amount: minorText(minimum - goods, terms.currency), currency: terms.currency };
}

function basketCautions(prepared: PreparedPlan, sheet: RunSheet): Problem[] {
  return prepared.suppliers.flatMap((supplier): Problem[] => {
    const at = { supplier: supplier.id };
    const turnedDown = sheet.barred.get(supplier.index);
    if (turnedDown !== undefined)
      return [{ code: "minimum-not-reached", at, facts: lacking(supplier, turnedDown) }];
    const goods = sheet.goods[supplier.index] as number;
    if (sheet.orders[supplier.index] === 0 || supplier.fee === 0 || goods >= supplier.minimum) return [];
    return [{ code: "below-minimum-fee", at, facts: lacking(supplier, goods) }];
  });
}

function quoteCautions({ plan, quotes }: PreparedPlan): Problem[] {
  const { chosenQuote } = plan.boards;
  const pinned = quotes.find(({ quote }) => quote.id === chosenQuote);
  if (chosenQuote === null || pinned?.standing === "usable") return [];
  return [{ code: "pinned-quote-unusable", at: { quote: chosenQuote }, facts: {} }];
}
