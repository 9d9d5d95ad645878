import type { KitPlan } from "#src/server/kit-plan.ts";
import type { Plan } from "#src/shapes/plan.ts";

/**
 * What a person can change of a plan, row by row as the server keeps it. `price` and `weight` are one row of the
 * database with two addresses, because different roles may change them.
 */
export type PlanRow =
  | { kind: "run" | "hour-rate" }
  | { kind: "price" | "weight" | "task" | "packing" | "charge" | "channel"; id: string };

export type RowKind = PlanRow["kind"];
export type Fields = Record<string, unknown>;

type RunField = keyof RunFields;
interface RunFields {
  kits: number;
  sweepTo: number;
  boardYield: string;
  boardConfidence: string;
  chosenQuoteId: string | null;
  learningSlope: string;
  kitsMadeBefore: number;
  replacementShare: string;
  replacementCost: string | null;
}

/** Where each field of the run plan stands in the plan. */
function runFields(plan: Plan): RunFields {
  return {
    kits: plan.run.kits,
    sweepTo: plan.run.sweepTo,
    boardYield: plan.boards.yield,
    boardConfidence: plan.boards.confidence,
    chosenQuoteId: plan.boards.chosenQuote,
    learningSlope: plan.work.learningSlope,
    kitsMadeBefore: plan.work.kitsMadeBefore,
    replacementShare: plan.replacements.share,
    replacementCost: plan.replacements.costEach,
  };
}

function withRunFields(plan: Plan, fields: Partial<RunFields>): Plan {
  const all = { ...runFields(plan), ...fields };
  const touches = (...names: RunField[]) => names.some((name) => name in fields);
  return {
    ...plan,
    run: touches("kits", "sweepTo") ? { kits: all.kits, sweepTo: all.sweepTo } : plan.run,
    boards: touches("boardYield", "boardConfidence", "chosenQuoteId")
      ? {
          ...plan.boards,
          yield: all.boardYield,
          confidence: all.boardConfidence,
          chosenQuote: all.chosenQuoteId,
        }
      : plan.boards,
    work: touches("learningSlope", "kitsMadeBefore")
      ? { ...plan.work, learningSlope: all.learningSlope, kitsMadeBefore: all.kitsMadeBefore }
      : plan.work,
    replacements: touches("replacementShare", "replacementCost")
      ? { share: all.replacementShare, costEach: all.replacementCost }
      : plan.replacements,
  };
}

type Listed = { id: string };
const withRow = <T extends Listed>(rows: readonly T[], id: string, fields: Fields): T[] =>
  rows.map((row) => (row.id === id ? { ...row, ...fields } : row));

/** A new spare rate holds for every part that has none of its own. */
function withSpareRate(held: KitPlan, rate: string): KitPlan {
  const own = new Set(held.spare.own);
  const parts = held.plan.parts.map((part) => (own.has(part.id) ? part : { ...part, spareRate: rate }));
  return { ...held, spare: { ...held.spare, rate }, plan: { ...held.plan, parts } };
}

/** The plan after some fields of a row took new values. Everything else stays the same object. */
export function withFields(held: KitPlan, row: PlanRow, fields: Fields): KitPlan {
  const { spareRate, ...others } = fields;
  const spared = typeof spareRate === "string" ? withSpareRate(held, spareRate) : held;
  return { ...spared, plan: withPlanFields(spared.plan, row, others) };
}

function withPlanFields(plan: Plan, row: PlanRow, fields: Fields): Plan {
  switch (row.kind) {
    case "run":
      return withRunFields(plan, fields as Partial<RunFields>);
    case "hour-rate":
      return { ...plan, work: { ...plan.work, ...fields } };
    case "price":
    case "weight":
      return { ...plan, editions: withRow(plan.editions, row.id, fields) };
    case "task":
      return { ...plan, work: { ...plan.work, tasks: withRow(plan.work.tasks, row.id, fields) } };
    case "packing":
      return { ...plan, packing: withRow(plan.packing, row.id, fields) };
    case "charge":
      return { ...plan, charges: withRow(plan.charges, row.id, fields) };
    case "channel":
      return { ...plan, channels: withRow(plan.channels, row.id, fields) };
  }
}

function rowOf(plan: Plan, row: PlanRow): Fields {
  const listed = (rows: readonly Listed[]) =>
    ("id" in row ? (rows.find(({ id }) => id === row.id) ?? {}) : {}) as Fields;
  switch (row.kind) {
    case "run":
      return { ...runFields(plan) };
    case "hour-rate":
      return { ratePerHour: plan.work.ratePerHour };
    case "price":
    case "weight":
      return listed(plan.editions);
    case "task":
      return listed(plan.work.tasks);
    case "packing":
      return listed(plan.packing);
    case "charge":
      return listed(plan.charges);
    case "channel":
      return listed(plan.channels);
  }
}

/** The values that the named fields of a row have now. */
export function fieldsNow(held: KitPlan, row: PlanRow, names: readonly string[]): Fields {
  const all: Fields = { ...rowOf(held.plan, row), spareRate: held.spare.rate };
  return Object.fromEntries(names.map((name) => [name, all[name]]));
}

/** Address below the kit's own (`/run`), or below the workshop's for the hour's rate. */
export function addressOf(row: PlanRow): { of: "kit" | "workshop"; path: string } {
  switch (row.kind) {
    case "hour-rate":
      return { of: "workshop", path: "/hour-rate" };
    case "price":
    case "weight":
      return { of: "kit", path: `/editions/${row.id}/${row.kind}` };
    case "task":
      return { of: "kit", path: `/tasks/${row.id}` };
    case "packing":
      return { of: "kit", path: `/packing/${row.id}` };
    case "charge":
      return { of: "kit", path: `/charges/${row.id}` };
    case "channel":
      return { of: "kit", path: `/channels/${row.id}` };
    default:
      return { of: "kit", path: `/${row.kind}` };
  }
}

/** What carries the version of a row: two rows with the same holder are saved one after the other. */
export function holderOf(row: PlanRow): string {
  if ("id" in row) return row.id;
  return row.kind === "hour-rate" ? "workshop" : "run";
}

export function versionOf(versions: KitPlan["versions"], holder: string): number {
  if (holder === "run") return versions.run;
  return holder === "workshop" ? versions.workshop : (versions.rows[holder] ?? 1);
}

export function withVersion(
  versions: KitPlan["versions"],
  holder: string,
  version: number,
): KitPlan["versions"] {
  if (holder === "run") return { ...versions, run: version };
  if (holder === "workshop") return { ...versions, workshop: version };
  return { ...versions, rows: { ...versions.rows, [holder]: version } };
}
