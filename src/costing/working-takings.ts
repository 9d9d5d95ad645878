import { grainText } from "./grains.ts";
import { type Fraction, fraction, nearest, times } from "./price/fraction.ts";
import { takingsFrom } from "./price/takings.ts";
import type { Need } from "./problem.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, notKnown, number, type Sheet, step, summed } from "./working-lines.ts";
import { EXACT } from "./working-run.ts";

/** What every edition's kits bring, and together (sections 10 and 11). */
export function bringsSheet({ result, prepared }: WorkingContext): Sheet {
  const { currency } = result;
  const sold = result.editions.flatMap((edition, index) => {
    const kit = prepared.sold[index];
    return edition.kits === 0 || kit === undefined ? [] : [{ edition, kit }];
  });
  const groups = sold.map(({ edition, kit }) => {
    const { kits, name, id } = edition;
    const cash = (value: Fraction, needs: Need[]) =>
      needs.length > 0 ? notKnown(needs) : money(nearest(value), currency);
    const all = cash(times(kit.brings, fraction(BigInt(kits))), kit.needs.brings);
    const label = `${name} brings`;
    return [
      step(null, `${name}, one kit keeps`, money(edition.kept, currency), "10", { opens: `kit-kept:${id}` }),
      step("−", "Time to sell it", cash(kit.timeCost, kit.needs.timeCost), "7"),
      step("×", `${name}, kits in the run`, count(kits, "kits"), "2", { source: from("run") }),
      step("=", label, all, "11", { result: sold.length === 1 }),
    ];
  });
  const parts = groups.flatMap((steps) => steps.slice(-1).map((one) => ({ ...one, sign: "+" as const })));
  const total = step("=", "The run brings", money(result.brings, currency), "11", { result: true });
  return {
    title: `What a run of ${result.kits} brings if every kit sells`,
    steps: [...groups.flat(), ...(sold.length === 1 ? [] : [...summed(parts), total])],
    notes: ["Tax, fees and postage are taken off order by order. A kit is the mean over its channels."],
    basis: `In ${currency}, after tax, fees and postage`,
  };
}

/** What one kit brings, over the mix (sections 10 and 11). */
export function bringsPerKitSheet(context: WorkingContext): Sheet {
  const { result } = context;
  return {
    title: `What one kit brings in a run of ${result.kits}`,
    steps: [
      step(null, "The run brings", money(result.brings, result.currency), "11", { opens: "brings" }),
      step("÷", "Kits in the run", count(result.kits, "kits"), "2", { source: from("run") }),
      step("=", "One kit brings", money(result.bringsPerKit, result.currency), "11", { result: true }),
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
      step(null, "The run brings", money(result.brings, currency), "11", { opens: "brings" }),
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
      step(null, "One kit brings", money(result.bringsPerKit, currency), "11", { opens: "brings-per-kit" }),
      step("−", "Cost per kit", money(result.perKit.used, currency), "8", { opens: "per-kit-used" }),
      step("=", "Earns per kit", money(result.earnsPerKit, currency), "11", { result: true }),
    ],
    notes: ["Both are carried exactly; the difference is written to the nearest cent."],
  };
}

/** What is left for the hours of making and selling, and per hour (section 7). */
export function perHourSheet({ result, sheet, prepared }: WorkingContext): Sheet {
  const { currency, work, kits, earnedPerHour } = result;
  const others = sheet.money.used - sheet.money.work;
  const kept = takingsFrom(prepared.takings.kept, sheet.kitsOf) ?? 0n;
  const selling = takingsFrom(prepared.takings.minutes, sheet.kitsOf) ?? 0n;
  const minutes = sheet.money.minutes + selling;
  const amount = (value: bigint) =>
    earnedPerHour.known ? money(value, currency) : money(earnedPerHour, currency);
  const ofSelling = (value: bigint) =>
    work.sellingMinutes.known ? number(grainText(value), "min") : notKnown(work.sellingMinutes.needs);
  return {
    title: `Earned per hour in a run of ${kits}`,
    steps: [
      step(null, "Minutes to make the run", number(work.minutes, "min"), "7", { opens: "head:work" }),
      step("+", "Minutes to sell it", ofSelling(selling), "7", { source: from("price") }),
      step("=", "Minutes of the run", ofSelling(minutes), "7"),
      step(null, "The run keeps", money(result.kept, currency), "10"),
      step("−", "All costs but own work", amount(others), "7", { opens: "used" }),
      step("=", "Left for the hours", amount(kept - others), "7"),
      step("×", "Minutes in an hour", number("60", "min"), "7"),
      step("÷", "Minutes of the run", ofSelling(minutes), "7"),
      step("=", "Earned per hour", money(earnedPerHour, currency), "7", { result: true }),
    ],
    notes: ["The time to sell the kits counts as work, as does the time to make them."],
  };
}
