import type { WorkingContext } from "./working.ts";
import { count, from, money, number, type Sheet, type Step, step, summed } from "./working-lines.ts";
import { EXACT } from "./working-run.ts";

/** What every edition's kits bring, and together. */
export function keptSheet(context: WorkingContext): Sheet {
  const { result } = context;
  return {
    title: `What a run of ${result.kits} brings if every kit sells`,
    steps: keptSteps(context, true),
    notes: ["Tax, fees and postage are taken off sale by sale."],
    basis: `In ${result.currency}, after tax, fees and postage`,
  };
}

function keptSteps({ result, sheet, prepared }: WorkingContext, isResult: boolean): Step[] {
  const { currency } = result;
  const sold = result.editions.filter(({ kits }) => kits > 0);
  const groups = sold.flatMap((edition) => [
    step(null, `${edition.name}, kept from one sale`, money(edition.sale.kept, currency), "10", {
      opens: `sale:${edition.id}`,
      source: from("price", edition.id),
    }),
    step("×", `${edition.name}, kits in the run`, count(edition.kits, "kits"), "2", { source: from("run") }),
    step("=", `${edition.name} brings`, ofEdition(edition.id), "11", {
      result: isResult && sold.length === 1,
    }),
  ]);
  function ofEdition(id: string) {
    const index = prepared.plan.editions.findIndex((edition) => edition.id === id);
    const each = prepared.keptPerSale[index] ?? null;
    const known = result.editions[index]?.sale.kept ?? result.kept;
    return each === null ? money(known, currency) : money(each * BigInt(sheet.kitsOf[index] ?? 0), currency);
  }
  if (sold.length < 2) return groups;
  const total = sold.map((edition) => step("+", `${edition.name} brings`, ofEdition(edition.id), "11"));
  return [
    ...groups,
    ...summed(total),
    step("=", "The run brings", money(result.kept, currency), "11", { result: isResult }),
  ];
}

/** What one kit brings, over the mix (sections 10 and 11). */
export function keptPerKitSheet(context: WorkingContext): Sheet {
  const { result } = context;
  return {
    title: `What one kit brings in a run of ${result.kits}`,
    steps: [
      step(null, "The run brings", money(result.kept, result.currency), "11", { opens: "kept" }),
      step("÷", "Kits in the run", count(result.kits, "kits"), "2", { source: from("run") }),
      step("=", "One kit brings", money(result.keptPerKit, result.currency), "11", { result: true }),
    ],
    notes: result.editions.length > 1 ? ["The mean over the editions of the run."] : [],
    basis: `In ${result.currency}, after tax, fees and postage`,
  };
}

/** Takings less used cost (section 11). */
export function profitSheet({ result }: WorkingContext): Sheet {
  const { currency, kits } = result;
  return {
    title: `Profit of a run of ${kits} if every kit sells`,
    steps: [
      step(null, "The run brings", money(result.kept, currency), "11", { opens: "kept" }),
      step("−", "Used by the run", money(result.used, currency), "8", { opens: "used" }),
      step("=", "Profit", money(result.profit, currency), "11", { result: true }),
    ],
    notes: [EXACT],
  };
}

/** What one kit brings less what it costs (section 11). */
export function earnsSheet({ result }: WorkingContext): Sheet {
  const { currency, kits } = result;
  return {
    title: `Earned per kit in a run of ${kits}`,
    steps: [
      step(null, "One kit brings", money(result.keptPerKit, currency), "11", { opens: "kept-per-kit" }),
      step("−", "Cost per kit", money(result.perKit.used, currency), "8", { opens: "per-kit-used" }),
      step("=", "Earns per kit", money(result.earnsPerKit, currency), "11", { result: true }),
    ],
    notes: ["Both are carried exactly; the difference is written to the nearest cent."],
  };
}

/** What is left for the hours, and per hour (section 7). */
export function perHourSheet({ result, sheet }: WorkingContext): Sheet {
  const { currency, work, kits } = result;
  const others = sheet.money.used - sheet.money.work;
  const usedKnown = result.earnedPerHour.known;
  return {
    title: `Earned per hour in a run of ${kits}`,
    steps: [
      step(null, "The run brings", money(result.kept, currency), "7", { opens: "kept" }),
      step(
        "−",
        "All costs but own work",
        usedKnown ? money(others, currency) : money(result.earnedPerHour, currency),
        "7",
        {
          opens: "used",
        },
      ),
      step(
        "=",
        "Left for the hours",
        usedKnown ? money(sheet.money.kept - others, currency) : money(result.earnedPerHour, currency),
        "7",
      ),
      step("÷", "Hours of the run", number(work.hours, "hours"), "7", {
        opens: "head:work",
        source: from("run"),
      }),
      step("=", "Earned per hour", money(result.earnedPerHour, currency), "7", { result: true }),
    ],
    notes: ["Hours are minutes over 60, carried exactly."],
  };
}
