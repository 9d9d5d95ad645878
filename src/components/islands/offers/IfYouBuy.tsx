import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import { Chip } from "#src/components/islands/parts/Chip.tsx";
import { CELL, HEAD_CELL, HEAD_ROW, NUMBER, rowLook, TABLE, TOTAL_ROW } from "#src/components/table-look.ts";
import { orderPerKit, type RungOrder } from "#src/costing/order-curve.ts";
import { roundedText } from "#src/costing/rounded-text.ts";
import type { PartOrder } from "#src/costing/run-result.ts";

export interface IfYouBuyProps {
  rungs: readonly RungOrder[];
  order: PartOrder | null;
  currency: string;
  /** What the run is reckoned in, and one foreign unit in it; null: no rate. */
  reporting: string;
  rate: string | null;
  kits: number;
}

type Way = RungOrder & { order: number; costs: string; over: number };

/** The order that would do, the one that is placed, and the next one up: at most three. */
function waysOf(rungs: readonly RungOrder[], order: PartOrder | null): Way[] {
  const ways = rungs.filter((rung): rung is Way => rung.order !== null);
  const placed = ways.findIndex((way) => way.order === order?.quantity);
  if (placed < 0) return ways.slice(0, 2);
  const from = order?.boughtUp
    ? Math.max(
        0,
        ways.findIndex((way) => way.order === order.boughtUp?.insteadOf),
      )
    : placed;
  return placed === from ? ways.slice(from, from + 2) : ways.slice(from, placed + 1);
}

/** What each way of covering the need comes to, side by side. */
export function IfYouBuy({ rungs, order, currency, reporting, rate, kits }: IfYouBuyProps) {
  const ways = waysOf(rungs, order);
  if (ways.length === 0) return null;
  const rows: [string, (way: Way) => string][] = [
    ["Price each", (way) => unitPriceText(way.price, currency)],
    ["You pay", (way) => moneyText(way.costs, currency)],
    ["Left over", (way) => countText(way.over)],
  ];
  return (
    <div>
      <table className={TABLE}>
        <caption className="heard-only">What each order comes to</caption>
        <thead>
          <tr className={HEAD_ROW}>
            <th scope="col" className={HEAD_CELL}>
              If you buy
            </th>
            {ways.map((way) => (
              <th key={way.quantity} scope="col" className={`${HEAD_CELL} ${NUMBER}`}>
                {countText(way.order)}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(([name, figure]) => (
            <tr key={name} className={rowLook()}>
              <th scope="row" className={`${CELL} font-normal text-ink-2`}>
                {name}
              </th>
              {ways.map((way) => (
                <td key={way.quantity} className={`${CELL} ${NUMBER} font-semibold`}>
                  {figure(way)}
                </td>
              ))}
            </tr>
          ))}
          <tr className={`${TOTAL_ROW} rule-result border-t`}>
            <th scope="row" className={`${CELL} font-bold`}>
              In one kit
            </th>
            {ways.map((way) => (
              <td key={way.quantity} className={`${CELL} ${NUMBER} font-bold`}>
                {rate === null ? "no rate" : inOneKit(way, rate, kits, reporting)}
              </td>
            ))}
          </tr>
        </tbody>
      </table>
      {order && (
        <Chip kind="good" className="mt-4">
          {countText(order.quantity)} chosen
        </Chip>
      )}
    </div>
  );
}

/** Three decimals, as a unit price: the whole of it is read in "You pay". */
function inOneKit({ costs }: Way, rate: string, kits: number, reporting: string): string {
  return unitPriceText(roundedText(orderPerKit(costs, rate, kits), 3), reporting);
}
