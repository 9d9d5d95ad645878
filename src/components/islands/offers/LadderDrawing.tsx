import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import type { RungOrder } from "#src/costing/order-curve.ts";
import type { PartOrder } from "#src/costing/run-result.ts";

export interface LadderDrawingProps {
  /** Lowest first. */
  rungs: readonly RungOrder[];
  /** Pieces to buy; 0: nothing is needed, so nothing is marked. */
  need: number;
  /** The order placed at this offer, if it is the chosen one. */
  order: PartOrder | null;
  currency: string;
}

/** Measures of the drawing in px, wide and on a phone. */
interface Plan {
  width: number;
  left: number;
  right: number;
  narrow: boolean;
}
const WIDE: Plan = { width: 640, left: 104, right: 470, narrow: false };
const NARROW: Plan = { width: 358, left: 76, right: 302, narrow: true };

const TOP = 44;
const STEP = 100;
const ROOM_FOR_NEED = 20;
const FOOT = 46;

interface Placed extends RungOrder {
  y: number;
}

interface Layout {
  placed: Placed[];
  needY: number | null;
  height: number;
}

/** Rungs from the top, evenly, with room for the line of what is needed where it falls between two. */
function layout(rungs: readonly RungOrder[], need: number): Layout {
  const down = [...rungs].reverse();
  const below = need > 0 ? down.findIndex(({ quantity }) => quantity <= need) : -1;
  const extra = (place: number) => (below > 0 && place >= below ? ROOM_FOR_NEED : 0);
  const placed = down.map((rung, place) => ({ ...rung, y: TOP + place * STEP + extra(place) }));
  const end = placed.at(-1)?.y ?? TOP;
  const above = placed[below - 1];
  const reached = placed[below];
  const needY =
    need === 0
      ? null
      : reached === undefined
        ? end + 56
        : above === undefined
          ? reached.y - 34
          : (above.y + reached.y) / 2 + 2;
  return { placed, needY, height: Math.max(end, needY ?? 0) + FOOT };
}

/** The ladder of one offer: a rung for each break, what an order there costs, and how far up it pays to go. */
export function LadderDrawing(props: LadderDrawingProps) {
  return (
    <>
      <Ladder {...props} plan={WIDE} className="max-tablet:hidden" />
      <Ladder {...props} plan={NARROW} className="tablet:hidden" />
    </>
  );
}

function Ladder({
  rungs,
  need,
  order,
  currency,
  plan,
  className,
}: LadderDrawingProps & { plan: Plan; className: string }) {
  const { placed, needY, height } = layout(rungs, need);
  const chosen = order ? placed.find((rung) => rung.order === order.quantity) : undefined;
  const instead = order?.boughtUp
    ? placed.find((rung) => rung.order === order.boughtUp?.insteadOf)
    : undefined;
  return (
    <svg
      viewBox={`0 0 ${plan.width} ${height}`}
      width={plan.width}
      height={height}
      role="img"
      aria-label={spoken(rungs, need, order, currency)}
      className={`max-w-full ${className}`}
    >
      <path
        d={`M${plan.left} 10V${height - 8}M${plan.right} 10V${height - 8}`}
        className="stroke-ink"
        strokeWidth={4}
        strokeLinecap="round"
      />
      {needY !== null && <NeedLine {...{ plan, need }} y={needY} />}
      {placed.map((rung) => (
        <Rung key={rung.quantity} rung={rung} chosen={rung === chosen} {...{ plan, currency }} />
      ))}
      {chosen && instead && order?.boughtUp && (
        <StepUp
          from={instead.y}
          to={chosen.y}
          saves={moneyText(`-${order.boughtUp.saves}`, currency)}
          plan={plan}
          rungs={rungsUp(placed, instead, chosen)}
        />
      )}
    </svg>
  );
}

function rungsUp(placed: readonly Placed[], from: Placed, to: Placed): number {
  return placed.indexOf(from) - placed.indexOf(to);
}

function Rung({
  rung,
  chosen,
  plan,
  currency,
}: {
  rung: Placed;
  chosen: boolean;
  plan: Plan;
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
function NeedLine({ plan, need, y }: { plan: Plan; need: number; y: number }) {
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

function StepUp({
  from,
  to,
  saves,
  plan,
  rungs,
}: {
  from: number;
  to: number;
  saves: string;
  plan: Plan;
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

function spoken(
  rungs: readonly RungOrder[],
  need: number,
  order: PartOrder | null,
  currency: string,
): string {
  const steps = rungs.map(
    ({ quantity, price }) => `from ${countText(quantity)} ${unitPriceText(price, currency)} each`,
  );
  const buys = order
    ? ` ${countText(order.quantity)} are bought for ${moneyText(order.extended, currency)}.`
    : "";
  return `Price ladder: ${steps.join(", ")}.${need > 0 ? ` ${countText(need)} are needed.` : ""}${buys}`;
}
