import { moneyText, unitPriceText } from "#src/components/amount-text.ts";
import { CLASS_WORDS, CLASSES_IN_ORDER } from "#src/components/part-words.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import type { PartLine, RunResult } from "#src/costing/run-result.ts";
import { compressDesignators } from "#src/partslist/designators.ts";
import { lineFaults } from "#src/partslist/line-faults.ts";
import { type ResistorBands, resistorBands } from "#src/partslist/resistor-bands.ts";
import type { LineView, PartsList, PricedPartView } from "#src/server/present.ts";
import type { Plan } from "#src/shapes/plan.ts";
import { buyingState, IN_ORDER, type LineState, listState } from "./line-state.ts";

type AnyLine = LineView | LineView<PricedPartView>;

/** What the reckoning says of a line's part, as it is shown. */
export interface LineMoney {
  /** Supplier and order code that is bought from; empty where nothing is. */
  supplier: string;
  orderCode: string;
  pinned: boolean;
  /** Pieces ordered for the run; a part used by several lines is bought once. */
  buy: number;
  each: string;
  perKit: string;
  /** The line further up that the same part is bought with; `null` for the first line of a part. */
  boughtWith: string | null;
}

export interface LineRow {
  kind: "line";
  id: string;
  /** Its number in the list, counted from 1. */
  place: number;
  line: AnyLine;
  designators: string;
  bands: ResistorBands | null;
  state: LineState;
  money: LineMoney | null;
}
export interface GroupRow {
  kind: "group";
  id: string;
  name: string;
  count: number;
}
/** The line that is being written. */
export interface DraftRow {
  kind: "draft";
  id: "draft";
}
/** The last row: what all lines come to. */
export interface TotalRow {
  kind: "total";
  id: "total";
  cells: Readonly<Record<string, string>>;
}
export type GridRow = LineRow | GroupRow | DraftRow | TotalRow;

/** A unit price at least at three decimals. */
const UNIT_PLACES = 3;

function eachText(bought: PartLine): string {
  const [order] = bought.orders;
  if (!order) return "";
  if (bought.orders.length > 1) return "several";
  if (order.breakReached) return unitPriceText(order.breakReached.price, order.currency);
  return order.lots.length > 0 ? "in lots" : "";
}

function moneyOf(plan: Plan, bought: PartLine, boughtWith: string | null): LineMoney {
  const [order] = bought.orders;
  const perKit = bought.perKit.spent;
  const names = bought.orders.map((one) => plan.suppliers.find(({ id }) => id === one.supplier)?.name ?? "");
  const known = perKit.known ? unitPriceText(roundedText(perKit.value, UNIT_PLACES), plan.currency) : "";
  return {
    supplier: names.join(" + "),
    orderCode: bought.orders.length === 1 ? (order?.orderCode ?? "") : "",
    pinned: order?.pinned ?? false,
    buy: bought.ordered,
    each: eachText(bought),
    perKit: known,
    boughtWith,
  };
}

interface Bought {
  plan: Plan;
  run: RunResult;
}

/** What follows from a line alone; reckoned once for as long as the line is not replaced. */
interface Derived {
  designators: string;
  bands: ResistorBands | null;
}
const derivedFrom = new WeakMap<AnyLine, Derived>();

function derived(line: AnyLine): Derived {
  const known = derivedFrom.get(line);
  if (known) return known;
  const { value, unit, tolerance, spec } = line.part;
  const isResistor = line.part.class === "resistor" && unit === "ohm" && value !== null;
  const made = {
    designators: line.designators === "" ? "" : compressDesignators(line.designators.split(", ")),
    bands: isResistor ? resistorBands(value, tolerance ?? toleranceIn(spec)) : null,
  };
  derivedFrom.set(line, made);
  return made;
}

function sameRow(one: LineRow, other: LineRow): boolean {
  return (
    one.line === other.line &&
    one.place === other.place &&
    one.state.word === other.state.word &&
    JSON.stringify(one.money) === JSON.stringify(other.money)
  );
}

/**
 * For each line its row: number, colour code, state, and what the reckoning says of its part. A row that reads as
 * it did in `before` is the same object, so that the grid draws only what is new.
 */
export function lineRows(list: PartsList, bought: Bought | null, before: readonly LineRow[] = []): LineRow[] {
  const faults = lineFaults(list.lines);
  const planParts = new Map(bought?.plan.parts.map((part) => [part.id, part]));
  const partLines = new Map(bought?.run.parts.map((part) => [part.id, part]));
  const old = new Map(before.map((row) => [row.id, row]));
  const firstLines = new Map<string, string>();
  return list.lines.map((line: AnyLine, place): LineRow => {
    const own = listState(line, faults.get(line.id));
    const [planned, reckoned] = [planParts.get(line.part.id), partLines.get(line.part.id)];
    const isBought = line.mark === "in-kit" || line.mark === "option";
    const first = isBought ? firstLines.get(line.part.id) : undefined;
    if (isBought && first === undefined)
      firstLines.set(line.part.id, line.designators || `line ${place + 1}`);
    const buying = bought && planned && reckoned ? buyingState(bought.plan, planned, reckoned) : IN_ORDER;
    const row: LineRow = {
      kind: "line",
      id: line.id,
      place: place + 1,
      line,
      ...derived(line),
      state: own ?? buying,
      money: bought && reckoned && isBought ? moneyOf(bought.plan, reckoned, first ?? null) : null,
    };
    const known = old.get(line.id);
    return known && sameRow(known, row) ? known : row;
  });
}

/** A tolerance that only stands in the words: "5 %, 0.25 W". */
function toleranceIn(spec: string): string | null {
  return /(?:^|[\s,±])(\d+(?:[.,]\d+)?)\s?%/.exec(spec)?.[1] ?? null;
}

/** Which rows are looked at: all, those to settle, or those that changed since the last revision. */
export type LineFilter = "all" | "to-settle" | "changed";

const folded = (text: string) => text.toLowerCase().replace(/\u00a0/g, " ");

function said(row: LineRow): string {
  const { part, note, designators } = row.line;
  const { name, spec, package: body, drawer, manufacturer, manufacturerPartNumber } = part;
  const words = [designators, row.designators, name, spec, body, drawer, note, manufacturer];
  return folded([...words, manufacturerPartNumber, row.money?.supplier, row.money?.orderCode].join(" "));
}

/** The rows that a filter and the words in the find box leave; every word must be found. */
export function filteredRows(
  rows: readonly LineRow[],
  filter: LineFilter,
  find: string,
  changed: ReadonlySet<string>,
): LineRow[] {
  const words = folded(find).split(/\s+/).filter(Boolean);
  return rows.filter((row) => {
    if (filter === "to-settle" && !row.state.toSettle) return false;
    if (filter === "changed" && !changed.has(row.id)) return false;
    const text = words.length > 0 ? said(row) : "";
    return words.every((word) => text.includes(word));
  });
}

/** Rows under a heading for each kind of part, in the order a board is built. */
export function groupedRows(rows: readonly LineRow[]): GridRow[] {
  return CLASSES_IN_ORDER.flatMap((kind): GridRow[] => {
    const own = rows.filter(({ line }) => line.part.class === kind);
    if (own.length === 0) return [];
    const head: GroupRow = {
      kind: "group",
      id: `group ${kind}`,
      name: CLASS_WORDS[kind].many,
      count: own.length,
    };
    return [head, ...own];
  });
}

/** Pieces in one kit of an edition, do-not-place lines left out. */
export function piecesIn(list: PartsList, edition: string): number {
  return list.lines
    .filter(({ mark }) => mark !== "do-not-place")
    .reduce((sum: number, { quantities }) => sum + (quantities[edition] ?? 0), 0);
}

/** The edition with most pieces, which stands for the kit where there are several. */
export function fullestEdition(list: PartsList): { id: string; name: string; pieces: number } | undefined {
  const all = list.editions.map(({ id, name }) => ({ id, name, pieces: piecesIn(list, id) }));
  return all.reduce<(typeof all)[number] | undefined>(
    (most, one) => (most === undefined || one.pieces > most.pieces ? one : most),
    undefined,
  );
}

/** What all parts cost: for the run, and in one kit, as all that is spent on them without freight. */
export interface PartsTotal {
  run: string;
  perKit: string;
}

export function partsTotal({ plan, run }: Bought): PartsTotal | null {
  const head = run.heads.find(({ id }) => id === "parts");
  if (!head?.spent.known || !head.perKit.spent.known) return null;
  return {
    run: moneyText(head.spent.value, plan.currency),
    perKit: moneyText(head.perKit.spent.value, plan.currency),
  };
}
