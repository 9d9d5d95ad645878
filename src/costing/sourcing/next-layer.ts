import { convertMinor } from "#src/costing/conversion.ts";
import type { BasketCell } from "./basket-cells.ts";
import { compareBig, compareWays } from "./held-plan.ts";
import {
  type Ahead,
  bringsTo,
  type Choice,
  fits,
  type Labels,
  MEASURES,
  pathFrom,
  plainOf,
} from "./line-labels.ts";
import { trackedBill } from "./line-score.ts";
import type { MarketSupplier } from "./market.ts";
import type { OpenLine, OpenLines, Tracked } from "./open-lines.ts";
import type { Search } from "./search.ts";
import { exactOf } from "./undominated.ts";

/** A label that is being made. */
interface Label {
  excess: number;
  plain: number;
  filled: number[];
  choice: Choice;
  /** What it has cost so far, the baskets whose line is settled included. */
  cost: number;
  /** What the baskets cost that are done with, in grains. */
  exact: bigint;
  /** By tracked basket: by how much two of different goods may be told apart wrongly, for their rounding. */
  slacks: number[];
  /** Labels of the same key have their baskets alike, or in ranges of their own. */
  key: string;
}

interface Layer {
  labels: Label[];
  /** Places of labels that go on alike. */
  alike: Map<string, number>;
}

/** Every label followed by every open way of the next line, within the gap and the baskets' ranges. */
export function nextLayer(
  search: Search,
  open: OpenLines,
  labels: Labels,
  layer: number,
  gap: number,
): Labels {
  const { market } = search;
  const { part, ways } = open.lines[layer] as OpenLine;
  const ahead = labels.ahead[layer + 1] as Ahead;
  const made: Layer = { labels: [], alike: new Map() };
  const steps = ways.map(({ way, excess }) => ({
    way,
    excess,
    plain: plainOf(market, open, way),
    brings: bringsTo(market, open, way),
  }));
  for (let from = 0; from < labels.count; from += 1) {
    for (const step of steps) {
      const excess = (labels.excess[from] as number) + step.excess;
      if (excess > gap) continue;
      const filled = addTo(labels, from, step.brings);
      if (excess + leastPull(open, labels.limits, filled, ahead) > gap) continue;
      if (!fits(filled, ahead, labels.limits)) continue;
      const plain = (labels.plain[from] as number) + step.plain;
      const choice = { before: labels.last[from] as number, part, way: step.way };
      addLabel(search, open, labels, made, ahead, {
        excess,
        plain,
        filled,
        choice,
        cost: plain,
        exact: 0n,
        slacks: [],
        key: "",
      });
    }
  }
  return kept(search, open, labels, ahead, made);
}

function addTo({ filled, width }: Labels, from: number, brings: readonly number[]): number[] {
  return brings.map((amount, at) => {
    const held = filled[from * width + at] as number;
    return at % MEASURES < 2 ? held + amount : Math.max(held, amount);
  });
}

/** What a label's baskets add to the bound at least, by how far from the touching place they must end. */
function leastPull({ tracked }: OpenLines, limits: Ahead, filled: readonly number[], ahead: Ahead): number {
  let sum = 0;
  tracked.forEach(({ pull, touch }, index) => {
    if (pull === 0) return;
    const at = index * MEASURES;
    const low = Math.max((filled[at] as number) + (ahead.least[at] as number), limits.least[at] as number);
    const high = Math.min((filled[at] as number) + (ahead.most[at] as number), limits.most[at] as number);
    const add = pull * ((pull > 0 ? low : high) - touch);
    if (add > 0) sum += add;
  });
  return sum;
}

/** The range a tracked basket ends in whatever the lines ahead bring; null: still to be seen. */
function settledCell({ cells, byWeight }: Tracked, filled: readonly number[], ahead: Ahead, at: number) {
  const low = (filled[at] as number) + (ahead.least[at] as number);
  const high = (filled[at] as number) + (ahead.most[at] as number);
  const [light, heavy] = [
    (filled[at + 1] as number) + (ahead.least[at + 1] as number),
    (filled[at + 1] as number) + (ahead.most[at + 1] as number),
  ];
  const unknown = (filled[at + 2] as number) > 0;
  const mayBeUnknown = unknown || (ahead.most[at + 2] as number) > 0;
  const over = (cell: BasketCell) => {
    if (cell.goodsFrom > low || high > cell.goodsTo) return false;
    if (!byWeight) return true;
    if (!cell.anyWeight) return !mayBeUnknown && cell.weightFrom <= light && heavy <= cell.weightTo;
    return !cell.freightUnknown || unknown;
  };
  const found = cells.filter(over);
  return found.length === 1 ? (found[0] as BasketCell) : null;
}

/** Whether no line ahead touches a basket. */
function isDone({ most }: Ahead, at: number): boolean {
  return most[at] === 0 && most[at + 1] === 0 && most[at + 2] === 0 && most[at + 3] === 0;
}

function doneWith({ tracked }: OpenLines, ahead: Ahead): ReadonlySet<number> {
  return new Set(
    tracked.filter((_, index) => isDone(ahead, index * MEASURES)).map(({ supplier }) => supplier),
  );
}

/** What a basket costs that no line ahead touches; nothing where it has no order; Infinity where it is refused. */
function doneBasket(search: Search, tracked: Tracked, filled: readonly number[], at: number) {
  if (filled[at + 3] === 0) return { cost: 0, exact: 0n };
  const bill = trackedBill(search, tracked, filled, at);
  const { near, worth } = search.market.suppliers[tracked.supplier] as MarketSupplier;
  if (bill.refused) return { cost: Number.POSITIVE_INFINITY, exact: 0n };
  const cost = bill.total * near + (bill.freight === null ? search.unknown : 0);
  return { cost, exact: convertMinor(bill.total, worth) };
}

/**
 * Two labels with every basket alike, or settled within the same range, go on alike: of those the better stays. Where
 * settled baskets differ and are rounded, both stay unless the costs differ by more than rounding can make good.
 */
function addLabel(
  search: Search,
  open: OpenLines,
  labels: Labels,
  made: Layer,
  ahead: Ahead,
  label: Label,
): void {
  let alike = "";
  open.tracked.forEach((tracked, index) => {
    const at = index * MEASURES;
    if (isDone(ahead, at)) {
      const done = doneBasket(search, tracked, label.filled, at);
      label.cost += done.cost;
      label.exact += done.exact;
      label.slacks.push(0);
      return;
    }
    const cell = settledCell(tracked, label.filled, ahead, at);
    const use = tracked.byUse ? label.filled[at + 3] : "";
    const own = `${label.filled[at]} ${label.filled[at + 1]} ${label.filled[at + 2]} ${use},`;
    const line = cell ?? tracked.range;
    const inside = `${cell === null ? "to" : "in"} ${line === null ? "" : tracked.cells.indexOf(line)} ${use},`;
    label.key += line === null ? own : inside;
    alike += cell === null || cell.slack > 0 ? own : inside;
    label.slacks.push(line === null ? 0 : 2 * line.slack);
    if (line === null) return;
    const near = search.market.suppliers[tracked.supplier]?.near ?? 0;
    label.cost += line.multiple * near * (label.filled[at] as number);
  });
  if (label.cost === Number.POSITIVE_INFINITY) return;
  const held = made.alike.get(alike);
  if (held === undefined) made.alike.set(alike, made.labels.push(label) - 1);
  else if (goesBefore(search, open, labels, ahead, label, made.labels[held] as Label))
    made.labels[held] = label;
}

/** Whether a label goes before one that goes on alike. */
function goesBefore(
  search: Search,
  open: OpenLines,
  labels: Labels,
  ahead: Ahead,
  label: Label,
  held: Label,
): boolean {
  const off = label.cost - held.cost;
  if (Math.abs(off) > search.margin + 1e-11 * Math.abs(label.cost)) return off < 0;
  const own = [...pathFrom(labels, label.choice.before), label.choice];
  const other = [...pathFrom(labels, held.choice.before), held.choice];
  const sums = (path: readonly Choice[], of: (way: number) => bigint) =>
    path.reduce((sum, { way }) => sum + of(way), 0n);
  const { market } = search;
  const done = doneWith(open, ahead);
  const byWorth = compareBig(
    label.exact + sums(own, (way) => exactOf(market, way, done)),
    held.exact + sums(other, (way) => exactOf(market, way, done)),
  );
  const byLeft = () => compareBig(sums(own, market.leftWorth), sums(other, market.leftWorth));
  const inOrder = (path: readonly Choice[]) =>
    Int32Array.from(path.toSorted((a, b) => a.part - b.part).map(({ way }) => way));
  return (byWorth || byLeft() || compareWays(inOrder(own), inOrder(other))) < 0;
}

/** The layer's labels without those that are plainly dearer than another which can go on in every way they can. */
function kept(search: Search, open: OpenLines, labels: Labels, ahead: Ahead, made: Layer): Labels {
  const next: Labels = { ...labels, count: 0, excess: [], plain: [], filled: [], last: [] };
  const groups = new Map<string, Label[]>();
  for (const label of made.labels.toSorted((a, b) => a.cost - b.cost)) {
    const group = groups.get(label.key) ?? [];
    const bar = label.cost - search.margin - 1e-11 * Math.abs(label.cost);
    if (isDominated(open, labels.limits, ahead, label, group, bar)) continue;
    groups.set(label.key, group);
    if (group.length < COMPARED) group.push(label);
    next.count += 1;
    next.excess.push(label.excess);
    next.plain.push(label.plain);
    next.filled.push(...label.filled);
    next.last.push(labels.trail.push(label.choice) - 1);
  }
  return next;
}

/** Labels of a group that others are compared with; more would cost more than they save. */
const COMPARED = 64;

function isDominated(
  { tracked }: OpenLines,
  limits: Ahead,
  ahead: Ahead,
  label: Label,
  group: readonly Label[],
  bar: number,
): boolean {
  return group.some(({ cost, filled, slacks }) => {
    let room = bar - cost;
    return tracked.every(({ byWeight }, index) => {
      const at = index * MEASURES;
      if (filled[at] !== label.filled[at]) room -= slacks[index] as number;
      if (room <= 0) return false;
      return (
        goesOnAlike(filled, label.filled, at, limits, ahead) &&
        (!byWeight || goesOnAlike(filled, label.filled, at + 1, limits, ahead))
      );
    });
  });
}

/** Whether a basket stays in its range with whatever would keep another there. */
function goesOnAlike(
  own: readonly number[],
  other: readonly number[],
  at: number,
  limits: Ahead,
  ahead: Ahead,
): boolean {
  const amount = own[at] as number;
  if (amount === other[at]) return true;
  const safe =
    amount > (other[at] as number)
      ? amount + (ahead.most[at] as number) <= (limits.most[at] as number)
      : amount + (ahead.least[at] as number) >= (limits.least[at] as number);
  return safe;
}
