import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import type { LadderPlan, PlacedRung } from "./ladder-layout.ts";

export function Rung({
  rung,
  chosen,
  plan,
  currency,
}: {
  rung: PlacedRung;
  chosen: boolean;
  plan: LadderPlan;
  currency: string;
}) {
  const { left, right, narrow } = plan;
  const { y, quantity, price, order, costs, over } = rung;
  const figure = costs === null ? null : moneyText(costs, currency);
  const words =
    order === null || figure === null
      ? null
      : narrow
        ? order === quantity
          ? figure
          : `${countText(order)}: ${figure}`
        : `${countText(order)} for ${figure}`;
  return (
    <g className="type-label">
      <rect
        x={left - 6}
        y={y - (chosen ? 6 : 5)}
        width={right - left + 12}
        height={chosen ? 12 : 10}
        rx={chosen ? 6 : 5}
        strokeWidth={1.5}
        className={chosen ? "fill-petrol stroke-petrol" : "fill-sheet stroke-ink"}
      />
      <text
        x={left - 20}
        y={y + 5}
        textAnchor="end"
        className={`fill-ink font-semibold ${chosen ? "text-[1.0625rem] font-bold" : ""}`}
      >
        {countText(quantity)}
      </text>
      <text
        x={left + (narrow ? 14 : 22)}
        y={y - 16}
        className={chosen ? "fill-ink font-semibold" : "fill-ink-2"}
      >
        {unitPriceText(price, currency)} each
      </text>
      {words && (
        <text
          x={right - (narrow ? 12 : 20)}
          y={y - 16}
          textAnchor="end"
          className={chosen ? "fill-petrol text-[1.0625rem] font-bold" : "fill-ink font-semibold"}
        >
          {words}
        </text>
      )}
      {over !== null && over > 0 && (
        <text x={right - (narrow ? 12 : 20)} y={y + 28} textAnchor="end" className="fill-ink-2">
          {countText(over)} over
        </text>
      )}
    </g>
  );
}

/** What is needed stands between two rungs: a ring on the rail, a copper line across. */
export function NeedLine({ plan, need, y }: { plan: LadderPlan; need: number; y: number }) {
  return (
    <g>
      <path d={`M${plan.left} ${y}H${plan.right - 2}`} strokeWidth={2} className="stroke-copper-metal" />
      <circle cx={plan.left} cy={y} r={7} strokeWidth={4} className="fill-logo-tin stroke-copper-metal" />
      <text
        x={plan.left - 20}
        y={y + (plan.narrow ? -4 : 5)}
        textAnchor="end"
        className="fill-copper font-semibold type-label"
      >
        {plan.narrow ? "need" : `need ${countText(need)}`}
        {plan.narrow && (
          <tspan x={plan.left - 20} dy={18}>
            {countText(need)}
          </tspan>
        )}
      </text>
    </g>
  );
}

export function StepUp({
  from,
  to,
  saves,
  plan,
  rungs,
}: {
  from: number;
  to: number;
  saves: string;
  plan: LadderPlan;
  rungs: number;
}) {
  const x = plan.right + (plan.narrow ? 22 : 26);
  return (
    <g className="type-label">
      <path
        d={`M${plan.right + 12} ${from}H${x}V${to + 10}`}
        fill="none"
        strokeWidth={2.25}
        className="stroke-petrol"
      />
      <path d={`M${x} ${to - 2}l-6 13h12z`} className="fill-petrol" />
      {!plan.narrow && (
        <>
          <text x={x + 16} y={(from + to) / 2 - 6} className="fill-petrol text-[1.0625rem] font-bold">
            {saves}
          </text>
          <text x={x + 16} y={(from + to) / 2 + 15} className="fill-ink-2">
            {rungs === 1 ? "one rung up" : `${rungs} rungs up`}
          </text>
        </>
      )}
    </g>
  );
}
