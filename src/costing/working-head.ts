import { scaled } from "./grains.ts";
import { kitsWith } from "./kit-costs.ts";
import { roundedText } from "./rounded-text.ts";
import type { Head, HeadId } from "./run-result.ts";
import type { WorkingContext } from "./working.ts";
import { count, from, money, number, rate, type Sheet, type Step, step, summed } from "./working-lines.ts";
import { HEAD_NAMES, percent } from "./working-run.ts";
import type { FigureId } from "./working-tree.ts";

/** One head of the run's cost, line by line, and per kit. */
export function headSheet(context: WorkingContext, id: HeadId): Sheet {
  const { result } = context;
  const { currency, kits } = result;
  const head = result.heads.find((one) => one.id === id) as Head;
  const { name, page } = HEAD_NAMES[id];
  const lines = id === "replacements" ? replacementSteps(context) : summed(headSteps(context, head));
  const perKit = head.perKit.spent;
  return {
    title: `${name} of a run of ${kits}`,
    steps: [
      ...lines,
      step(lines.length === 0 ? null : "=", name, money(head.spent, currency), "8", { source: from(page) }),
      step("÷", "Kits in the run", count(kits, "kits"), "8", { source: from("run") }),
      step("=", `${name} per kit`, money(perKit, currency), "8", { result: true }),
    ],
    notes: notesOf(context, id),
  };
}

function headSteps(context: WorkingContext, head: Head): Step[] {
  const { currency } = context.result;
  return head.lines
    .filter(({ amount }) => !amount.known || amount.value !== "0")
    .map((line) =>
      step("+", labelOf(context, head.id, line), money(line.amount, currency), "8", {
        opens: opensOf(context, head.id, line.id),
        source: from(HEAD_NAMES[head.id].page, line.id.split(":")[0] ?? null),
      }),
    );
}

function labelOf({ prepared, sheet }: WorkingContext, head: HeadId, line: Head["lines"][number]): string {
  const { plan } = prepared;
  if (head === "boards")
    return `${line.name}, ${line.id.endsWith(":boards") ? "boards" : "engineering and stencil"}`;
  if (head === "packing") {
    const packing = prepared.packing.find(({ item }) => item.id === line.id);
    const kits = packing ? kitsWith(packing.applies, sheet.kitsOf) : 0;
    return packing?.item.costPerKit ? `${line.name}, ${kits} kits at ${packing.item.costPerKit}` : line.name;
  }
  if (head === "one-off") {
    const charge = plan.charges.find(({ id }) => id === line.id);
    if (charge?.spreadOver) {
      return `${line.name}, ${Math.min(sheet.kits, charge.spreadOver)} of ${charge.spreadOver} kits' share of ${charge.amount}`;
    }
  }
  if (head === "freight") return `Parcel from ${line.name}`;
  return line.name;
}

function opensOf({ result }: WorkingContext, head: HeadId, id: string): FigureId | null {
  if (head === "parts") return `part:${id}`;
  if (head === "work") return `task:${id}`;
  if (head === "boards") return `quote:${id.slice(0, id.lastIndexOf(":"))}`;
  if (head !== "freight") return null;
  return result.baskets.some(({ supplier }) => supplier === id) ? `basket:${id}` : `quote:${id}`;
}

function replacementSteps({ prepared, result }: WorkingContext): Step[] {
  const { share, costEach } = prepared.plan.replacements;
  if (scaled(share, 6) === 0n || costEach === null) return [];
  return [
    step(null, "Kits in the run", count(result.kits, "kits"), "8", { source: from("run") }),
    step("×", "Share that needs a part sent again", rate(share), "8", { source: from("run") }),
    step("×", "Cost of sending one", money(costEach, result.currency), "8", { source: from("run") }),
  ];
}

function notesOf({ result }: WorkingContext, id: HeadId): string[] {
  if (id === "parts")
    return ["Each line is what the supplier charges, rounded to its minor unit, and then converted."];
  if (id === "freight")
    return ["Freight, handling and small-order fees of each parcel, boards' freight included."];
  if (id === "work")
    return [
      `Minutes of a first kit fall by the learning curve; ${roundedText(result.work.hours, 2)} hours in all.`,
    ];
  if (id === "one-off")
    return ["A charge spread over a number of kits is borne by the share of them made here."];
  return [];
}

/** Minutes, hours and cost of one task (section 7). */
export function taskSheet({ prepared, result }: WorkingContext, id: string): Sheet | null {
  const task = result.work.tasks.find((one) => one.id === id);
  const stated = prepared.plan.work.tasks.find((one) => one.id === id);
  if (task === undefined || stated === undefined) return null;
  const { currency, work } = result;
  const { learningSlope, kitsMadeBefore } = prepared.plan.work;
  const learning = scaled(learningSlope, 6) < 1_000_000n;
  return {
    title: `${task.name}, in a run of ${result.kits}`,
    steps: [
      step(null, "Minutes for a first kit", number(stated.minutesPerKit, "min"), "7", {
        source: from("run"),
      }),
      step(
        "×",
        learning ? `Learning factors of ${task.kits} kits, summed` : "Kits that need it",
        number(task.factorSum, learning ? "" : "kits"),
        "7",
      ),
      step("+", "Minutes to set up", number(task.minutesSettingUp, "min"), "7", { source: from("run") }),
      step("=", "Minutes of the run", number(task.minutes, "min"), "7"),
      step("÷", "Minutes in an hour", number("60", "min"), "7"),
      step(
        "×",
        "Rate per hour",
        work.ratePerHour === null ? money(task.cost, currency) : money(work.ratePerHour, currency),
        "7",
        { source: from("run") },
      ),
      step("=", task.name, money(task.cost, currency), "7", { result: true }),
    ],
    notes: learning
      ? [
          `Kit number i takes i^(log2 ${learningSlope}) of a first kit's time, that is ${percent(learningSlope)} for each doubling, each factor to 12 decimals; counted on from ${kitsMadeBefore} made before.`,
        ]
      : [],
  };
}
