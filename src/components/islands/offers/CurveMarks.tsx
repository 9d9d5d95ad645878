import { usePlotArea } from "recharts";
import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import { INK, INK_2, LINE_NAME, PETROL, RUN_RING } from "#src/components/islands/chart-theme.ts";
import { type NameBox, nameWidth, overlaps } from "#src/components/islands/charts/label-room.ts";
import { type Pixels, usePixels } from "#src/components/islands/charts/pixels.ts";
import type { CurveChartProps } from "./CurveChart.tsx";
import { priceStretches } from "./curve-points.ts";

/** A name at the line: its box, its end, and one or two lines. */
interface CurveName {
  box: NameBox;
  anchor: "start" | "end";
  words: string;
  below?: string;
}

function nameAt(at: Pixels, side: "above" | "below", words: string, below?: string): CurveName {
  const width = nameWidth(words, below ?? "");
  const height = below === undefined ? 20 : 39;
  const box =
    side === "above"
      ? { left: at.x - 10 - width, right: at.x - 10, top: at.y - 8 - height, bottom: at.y - 8 }
      : { left: at.x + 12, right: at.x + 12 + width, top: at.y + 12, bottom: at.y + 12 + height };
  return { box, anchor: side === "above" ? "end" : "start", words, below };
}

/** Moved to the left where it would leave the plot. */
function within(name: CurveName, right: number): CurveName {
  const past = Math.max(0, name.box.right - right);
  return { ...name, box: { ...name.box, left: name.box.left - past, right: name.box.right - past } };
}

/** What is needed, what is ordered, what would do, and the price of each break, at the line. */
export function CurveMarks(props: CurveChartProps) {
  const pixels = usePixels();
  const plot = usePlotArea();
  if (!pixels || !plot) return null;
  const { terms, rows, need, order, narrow } = props;
  const { currency } = terms;
  const right = plot.x + plot.width;
  const amount = (quantity: number, costs: string) =>
    narrow ? moneyText(costs, currency) : `${countText(quantity)} for ${moneyText(costs, currency)}`;
  const ring = order && pixels(order.quantity, Number(order.extended));
  const instead = order?.boughtUp;
  const dot = instead && pixels(instead.insteadOf, Number(instead.insteadOfCosts));
  const eachOrdered = order && ordered(props);
  const named = [
    ...(ring && order
      ? [
          within(
            nameAt(ring, "below", amount(order.quantity, order.extended), eachOrdered ?? undefined),
            right,
          ),
        ]
      : []),
    ...(dot && instead && !narrow
      ? [nameAt(dot, "above", amount(instead.insteadOf, instead.insteadOfCosts))]
      : []),
  ];
  const each = priceStretches(terms, rows).flatMap(({ price, from, to }) => {
    const row = rows.find(({ quantity }) => quantity >= (from + to) / 2);
    const name =
      row && nameAt(pixels(row.quantity, row.pays), "below", `${unitPriceText(price, currency)} each`);
    const long = pixels(to, 0).x - pixels(from, 0).x > 50;
    const clear = name && name.box.right <= right && named.every(({ box }) => !overlaps(box, name.box));
    return name && long && clear && name.words !== eachOrdered ? [name] : [];
  });
  return (
    <g>
      {need > 0 && <NeedLine {...props} foot={plot.y + plot.height} />}
      {each.map((name) => (
        <Name key={name.words} name={name} quiet />
      ))}
      {dot && <circle cx={dot.x} cy={dot.y} r={4} fill={INK} />}
      {ring && <circle cx={ring.x} cy={ring.y} {...RUN_RING} />}
      {named.map((name) => (
        <Name key={name.words} name={name} />
      ))}
    </g>
  );
}

/** "€0.062 each", of the order that is placed. */
function ordered({ terms, order }: CurveChartProps): string | null {
  if (terms.priceModel !== "whole-order" || !order) return null;
  const rung = terms.breaks
    .toSorted((a, b) => a.quantity - b.quantity)
    .findLast(({ quantity }) => quantity <= order.quantity);
  return rung ? `${unitPriceText(rung.price, terms.currency)} each` : null;
}

function Name({ name: { box, anchor, words, below }, quiet }: { name: CurveName; quiet?: boolean }) {
  const x = anchor === "end" ? box.right : box.left;
  return (
    <text y={box.top + 15} {...LINE_NAME} textAnchor={anchor}>
      <tspan x={x} fill={quiet ? INK_2 : INK} fontWeight={quiet ? 400 : 600}>
        {words}
      </tspan>
      {below && (
        <tspan x={x} dy={19} fill={INK_2} fontWeight={400}>
          {below}
        </tspan>
      )}
    </text>
  );
}

/** From the axis up to what the number needed costs. */
function NeedLine({ rows, need, foot }: CurveChartProps & { foot: number }) {
  const pixels = usePixels();
  const reached = rows.find(({ quantity }) => quantity >= need);
  if (!pixels || !reached) return null;
  const { x, y } = pixels(need, reached.pays);
  return (
    <g>
      <path d={`M${x} ${foot}V${y}`} stroke={PETROL} strokeWidth={1.5} strokeDasharray="4 3" fill="none" />
      <text x={x - 8} y={foot - 10} {...LINE_NAME} textAnchor="end" fill={PETROL}>
        need {countText(need)}
      </text>
    </g>
  );
}
