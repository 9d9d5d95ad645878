import { countText, moneyText, unitPriceText } from "#src/components/amount-text.ts";
import type { RungOrder } from "#src/costing/order-curve.ts";
import type { PartOrder } from "#src/costing/run-result.ts";
import { NeedLine, Rung, StepUp } from "./LadderMarks.tsx";
import { type LadderPlan, ladderLayout, NARROW, type PlacedRung, WIDE } from "./ladder-layout.ts";

export interface LadderDrawingProps {
  /** Lowest first. */
  rungs: readonly RungOrder[];
  /** Pieces to buy; 0: nothing is needed, so nothing is marked. */
  need: number;
  /** The order placed at this offer, if it is the chosen one. */
  order: PartOrder | null;
  currency: string;
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
}: LadderDrawingProps & { plan: LadderPlan; className: string }) {
  const { placed, needY, height } = ladderLayout(rungs, need);
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

function rungsUp(placed: readonly PlacedRung[], from: PlacedRung, to: PlacedRung): number {
  return placed.indexOf(from) - placed.indexOf(to);
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
