import type { BasketCell } from "./basket-cells.ts";
import type { MarketSupplier } from "./market.ts";
import type { Search } from "./search.ts";

/**
 * A straight line that lies nowhere above what a supplier's basket costs: floor + goods × near × `perGoods` +
 * weight × `perWeight`, in hundredths of the plan's currency; and where it touches.
 */
export interface SupportLine {
  perGoods: number;
  perWeight: number;
  floor: number;
  goods: number;
  weight: number;
  cell: BasketCell | null;
}

/** A supplier of the market, with the cells its basket may be in. */
export interface Reach {
  supplier: number;
  cells: readonly BasketCell[];
}

/**
 * The highest such line of two given slopes. With no cell within reach the floor is Infinity.
 *
 * @example flat 4.90, free from 50.00, slope 0.902 → floor 4.90, touching at no goods and at 50.00
 */
export function lineOf(search: Search, reach: Reach, perGoods: number, perWeight: number): SupportLine {
  const line: SupportLine = {
    perGoods,
    perWeight,
    floor: Number.POSITIVE_INFINITY,
    goods: 0,
    weight: 0,
    cell: null,
  };
  const goodsMost = search.goodsMost[reach.supplier] as number;
  const weightMost = search.weightMost[reach.supplier] as number;
  const { near } = search.market.suppliers[reach.supplier] as MarketSupplier;
  for (const cell of reach.cells) {
    if (cell.goodsFrom > goodsMost || cell.weightFrom > weightMost) continue;
    const slope = (cell.multiple - perGoods) * near;
    const goods = slope >= 0 ? cell.goodsFrom : Math.min(cell.goodsTo, goodsMost);
    const weight = perWeight <= 0 ? cell.weightFrom : Math.min(cell.weightTo, weightMost);
    const penalty = cell.freightUnknown ? search.unknown : 0;
    const floor = cell.fixed - cell.slack + penalty + slope * goods - perWeight * weight;
    if (floor >= line.floor) continue;
    line.floor = floor;
    line.goods = goods;
    line.weight = weight;
    line.cell = cell;
  }
  return line;
}

/** The line that is highest at a basket of about so much, among those through corners of the cells. */
export function lineAt(search: Search, reach: Reach, goods: number, weight: number): SupportLine {
  const { near } = search.market.suppliers[reach.supplier] as MarketSupplier;
  const goodsMost = search.goodsMost[reach.supplier] as number;
  const perGoods =
    reach.cells.length === 1
      ? (reach.cells[0] as BasketCell).multiple
      : slopeAt(goodsCorners(search, reach, near, goodsMost), goods * near, nearest(reach, goods).multiple);
  const line = lineOf(search, reach, perGoods, 0);
  if (
    reach.cells.every(({ weightFrom, weightTo }) => weightFrom === 0 && weightTo === Number.POSITIVE_INFINITY)
  )
    return line;
  const perWeight = slopeAt(weightCorners(search, reach, goods), weight, 0);
  const weighed = lineOf(search, reach, perGoods, perWeight);
  return weighed.floor + perWeight * weight > line.floor ? weighed : line;
}

function nearest({ cells }: Reach, goods: number): BasketCell {
  const distance = ({ goodsFrom, goodsTo }: BasketCell) => Math.max(goodsFrom - goods, goods - goodsTo, 0);
  return cells.reduce((best, cell) => (distance(cell) < distance(best) ? cell : best));
}

type Corner = readonly [number, number];

function goodsCorners(search: Search, { cells }: Reach, near: number, most: number): Corner[] {
  return cells.flatMap((cell): Corner[] => {
    const fixed = cell.fixed - cell.slack + (cell.freightUnknown ? search.unknown : 0);
    const at = (goods: number): Corner => [goods * near, fixed + cell.multiple * near * goods];
    return [at(cell.goodsFrom), at(Math.min(cell.goodsTo, most))];
  });
}

function weightCorners(search: Search, { supplier, cells }: Reach, goods: number): Corner[] {
  const most = search.weightMost[supplier] as number;
  return cells
    .filter((cell) => cell.goodsFrom <= goods && goods <= cell.goodsTo && !cell.freightUnknown)
    .flatMap((cell): Corner[] => [
      [cell.weightFrom, cell.fixed],
      [Math.min(cell.weightTo, most), cell.fixed],
    ]);
}

/** Slope, over a place, of the lower hull of some corners; `beyond` where all lie on one side of it. */
function slopeAt(corners: readonly Corner[], place: number, beyond: number): number {
  let [lowest, slope] = [Number.POSITIVE_INFINITY, beyond];
  for (const [left, leftHeight] of corners) {
    if (left > place) continue;
    for (const [right, rightHeight] of corners) {
      if (right < place || right === left) continue;
      const own = (rightHeight - leftHeight) / (right - left);
      const height = leftHeight + own * (place - left);
      if (height < lowest) [lowest, slope] = [height, own];
    }
  }
  return slope;
}
