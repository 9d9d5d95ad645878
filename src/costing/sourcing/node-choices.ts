import { type Baskets, emptyBaskets, putWay } from "./held-plan.ts";
import type { Market } from "./market.ts";
import { countOf, type Prices } from "./prices.ts";

/** The parts that a node still has a choice for, the ways left to each, and what is settled. */
export interface NodeChoices {
  parts: Int32Array;
  /** The ways of the choice at `index` are ways[from[index]] … ways[from[index + 1] − 1]. */
  from: Int32Array;
  ways: Int32Array;
  /** Per part the way settled on; −1 where there is a choice, or none at all. */
  settled: Int32Array;
  baskets: Baskets;
  /** Parts that nobody in the set sells. */
  unbought: number;
}

/** Every part bought the way that counts least, by itself. */
export interface RelaxedLines {
  ways: Int32Array;
  /** By choice: what its least way counts for. */
  counts: Float64Array;
  /** By place in the choices' ways: what each counts for. */
  wayCounts: Float64Array;
  /** What all counts for together, settled parts included. */
  sum: number;
  baskets: Baskets;
}

/** Room for relaxed lines, to be filled again and again. */
export function emptyLines({ parts, suppliers, open }: Market): RelaxedLines {
  return {
    ways: new Int32Array(parts),
    counts: new Float64Array(parts),
    wayCounts: new Float64Array(open.length),
    sum: 0,
    baskets: emptyBaskets(suppliers.length),
  };
}

/** All open ways through suppliers of a set. */
export function choicesWithin(market: Market, inSet: Uint8Array): NodeChoices {
  const writer = startChoices(market, market.parts, market.open.length);
  for (let part = 0; part < market.parts; part += 1) {
    if (market.needed[part] === 0) continue;
    const end = market.first[part + 1] as number;
    for (let way = market.first[part] as number; way < end; way += 1)
      if (market.open[way] === 1 && isWithin(market, inSet, way)) writer.ways[writer.count++] = way;
    endLine(market, writer, part);
  }
  return finished(writer);
}

function isWithin(market: Market, inSet: Uint8Array, way: number): boolean {
  const end = market.orderTo[way] as number;
  for (let at = market.orderFrom[way] as number; at < end; at += 1)
    if (inSet[market.supplier[at] as number] === 0) return false;
  return true;
}

/** Choices while they are written, line by line. */
interface ChoiceWriter extends NodeChoices {
  /** Lines written, and ways written so far. */
  lines: number;
  count: number;
}

function startChoices(market: Market, lines: number, ways: number): ChoiceWriter {
  return {
    parts: new Int32Array(lines),
    from: new Int32Array(lines + 1),
    ways: new Int32Array(ways),
    settled: new Int32Array(market.parts).fill(-1),
    baskets: emptyBaskets(market.suppliers.length),
    unbought: 0,
    lines: 0,
    count: 0,
  };
}

/** Ends the line of a part after its ways: one of one way, or none, is settled. True: it stays open. */
function endLine(market: Market, writer: ChoiceWriter, part: number): boolean {
  const from = writer.from[writer.lines] as number;
  if (writer.count - from > 1) {
    writer.parts[writer.lines++] = part;
    writer.from[writer.lines] = writer.count;
    return true;
  }
  if (writer.count === from) writer.unbought += 1;
  else {
    const only = writer.ways[from] as number;
    writer.settled[part] = only;
    putWay(market, only, writer.baskets);
  }
  writer.count = from;
  return false;
}

function finished({
  parts,
  from,
  ways,
  lines,
  count,
  settled,
  baskets,
  unbought,
}: ChoiceWriter): NodeChoices {
  return {
    parts: parts.slice(0, lines),
    from: from.slice(0, lines + 1),
    ways: ways.slice(0, count),
    settled,
    baskets,
    unbought,
  };
}

/**
 * The choices without the ways whose counts exceed their line's least by more than a gap; the same where there are none.
 * The counts are those of the last relaxation, and go on to stand for what is left.
 */
export function choicesNear(
  market: Market,
  choices: NodeChoices,
  { counts, wayCounts }: RelaxedLines,
  gap: number,
): NodeChoices {
  const { parts, from, ways } = choices;
  const writer = startChoices(market, parts.length, ways.length);
  writer.settled.set(choices.settled);
  writer.baskets = copyBaskets(choices.baskets);
  writer.unbought = choices.unbought;
  let kept = 0;
  for (let index = 0; index < parts.length; index += 1) {
    const end = from[index + 1] as number;
    const least = counts[index] as number;
    for (let at = from[index] as number; at < end; at += 1)
      if ((wayCounts[at] as number) - least <= gap) {
        wayCounts[writer.count] = wayCounts[at] as number;
        writer.ways[writer.count++] = ways[at] as number;
      }
    if (endLine(market, writer, parts[index] as number)) counts[kept++] = least;
  }
  return writer.count === ways.length ? choices : finished(writer);
}

export interface ChoiceLine {
  part: number;
  ways: readonly number[];
}

/** Choices from lists; a line of one way or none is settled. `settled` and `baskets` are taken over and added to. */
export function choicesOf(
  market: Market,
  lines: readonly ChoiceLine[],
  settled: Int32Array,
  baskets: Baskets,
  unbought: number,
): NodeChoices {
  const open: ChoiceLine[] = [];
  let [missing, count] = [unbought, 0];
  for (const line of lines) {
    const only = line.ways[0] ?? -1;
    if (line.ways.length > 1) {
      open.push(line);
      count += line.ways.length;
    } else if (only < 0) missing += 1;
    else {
      settled[line.part] = only;
      putWay(market, only, baskets);
    }
  }
  const choices: NodeChoices = {
    parts: new Int32Array(open.length),
    from: new Int32Array(open.length + 1),
    ways: new Int32Array(count),
    settled,
    baskets,
    unbought: missing,
  };
  open.forEach(({ part, ways }, index) => {
    choices.parts[index] = part;
    choices.ways.set(ways, choices.from[index]);
    choices.from[index + 1] = (choices.from[index] as number) + ways.length;
  });
  return choices;
}

/** A copy of baskets, to be added to. */
export function copyBaskets({ goods, weight, unweighed, lines }: Baskets): Baskets {
  return { goods: goods.slice(), weight: weight.slice(), unweighed: unweighed.slice(), lines: lines.slice() };
}

/** Buys every part by itself at some prices; a part that is not to be had counts as not bought. */
export function relaxChoices(
  market: Market,
  omitted: number,
  prices: Prices,
  choices: NodeChoices,
  lines: RelaxedLines,
): void {
  const { parts, from, ways, settled } = choices;
  lines.ways.set(settled);
  lines.baskets.goods.set(choices.baskets.goods);
  lines.baskets.weight.set(choices.baskets.weight);
  lines.baskets.unweighed.set(choices.baskets.unweighed);
  lines.baskets.lines.set(choices.baskets.lines);
  let sum = omitted * choices.unbought + settledCount(market, prices, choices.baskets);
  for (let index = 0; index < parts.length; index += 1) {
    let [best, least] = [-1, omitted];
    const end = from[index + 1] as number;
    for (let at = from[index] as number; at < end; at += 1) {
      const way = ways[at] as number;
      const count = countOf(market, prices, way);
      lines.wayCounts[at] = count;
      if (count < least) {
        least = count;
        best = way;
      }
    }
    lines.ways[parts[index] as number] = best;
    lines.counts[index] = least;
    sum += least;
    if (best >= 0) putWay(market, best, lines.baskets);
  }
  lines.sum = sum;
}

/** What the settled parts count for; Infinity where one has no known weight and must have. */
function settledCount(market: Market, prices: Prices, { goods, weight, unweighed, lines }: Baskets): number {
  let sum = 0;
  for (let supplier = 0; supplier < goods.length; supplier += 1) {
    if (lines[supplier] === 0) continue;
    if (prices.weighedOnly[supplier] === 1 && (unweighed[supplier] as number) > 0)
      return Number.POSITIVE_INFINITY;
    const near = market.suppliers[supplier]?.near ?? 0;
    sum +=
      (prices.perGoods[supplier] as number) * near * (goods[supplier] as number) +
      (prices.perWeight[supplier] as number) * (weight[supplier] as number);
  }
  return sum;
}
