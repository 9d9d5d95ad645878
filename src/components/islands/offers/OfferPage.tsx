import { type ComponentType, useEffect, useState } from "react";
import { countText, moneyText } from "#src/components/amount-text.ts";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { PAIRS } from "#src/components/page-look.ts";
import type { LadderTerms } from "#src/costing/ladder.ts";
import { neverWorthBuying, rungOrders } from "#src/costing/order-curve.ts";
import type { Basket, PartLine, PartOrder } from "#src/costing/run-result.ts";
import { compressDesignators } from "#src/partslist/designators.ts";
import type { OfferPart } from "#src/server/kit-offers.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { CurveChartProps } from "./CurveChart.tsx";
import { IfYouBuy } from "./IfYouBuy.tsx";
import { type KitSupply, type KitSupplyProps, useKitSupply } from "./kit-supply.ts";
import { LadderDrawing } from "./LadderDrawing.tsx";
import { LotTable } from "./LotTable.tsx";
import { OffersSection } from "./OffersSection.tsx";
import { offerAnswer } from "./offer-answer.ts";
import { piecesOf, thePart } from "./offer-words.ts";
import { PartSteps } from "./PartSteps.tsx";

export type OfferPageProps = KitSupplyProps & { part: string };

/** One part of a kit: who supplies it, how many are bought, and what any other number would cost. */
export default function OfferPage(props: OfferPageProps) {
  const supply = useKitSupply(props);
  const part = supply.parts.find(({ id }) => id === props.part);
  const line = supply.run.parts.find(({ id }) => id === props.part);
  if (!part || !line) return <Question question="Which part?">This line is no longer in the list.</Question>;
  const shown = shownOffer(supply, line);
  const { deciding, rest } = offerAnswer(line, supply.nameOf);
  return (
    <>
      <PartSteps
        {...{ parts: supply.parts, part }}
        planned={supply.plan.parts.find(({ id }) => id === part.id)}
        hrefOf={supply.partHref}
      />
      <Question question={`Who supplies ${thePart(part)}, and how many?`}>
        <b>{deciding}</b> {rest}
      </Question>
      <div className={PAIRS}>
        {shown && <LadderSection {...{ supply, line, shown }} />}
        <OffersSection {...{ props, supply, part, line }} />
        {shown && shown.offer.breaks.length > 0 && <CurveSection {...{ part, line, shown }} />}
      </div>
    </>
  );
}

/** The offer whose ladder is drawn: the chosen one, or the best there is. */
interface Shown {
  offer: OfferView;
  order: PartOrder | null;
}

function shownOffer(supply: KitSupply, line: PartLine): Shown | null {
  const [order = null] = line.orders;
  const id = order?.offer ?? line.considered.find(({ standing }) => standing !== "no-price")?.offer;
  const offer = supply.offers.find((one) => one.id === id);
  return offer ? { offer, order: line.orders.length === 1 ? order : null } : null;
}

function termsOf({ priceModel, currency, breaks, minimumOrder, orderMultiple }: OfferView): LadderTerms {
  return { priceModel, currency, breaks, minimumOrder, orderMultiple };
}

function LadderSection({ supply, line, shown }: { supply: KitSupply; line: PartLine; shown: Shown }) {
  const { offer, order } = shown;
  const name = supply.nameOf(offer.supplierId);
  const lots = offer.priceModel === "lots";
  const rungs = lots || offer.breaks.length === 0 ? [] : rungOrders(termsOf(offer), Math.max(1, line.toBuy));
  const { plan } = supply;
  return (
    <Pair note={<HowMany {...{ supply, line, shown }} />}>
      <Section
        title={lots ? `The lots at ${name}` : `The ladder at ${name}`}
        aside={lots ? "several may be combined" : "quantity, price each, and what you would pay"}
      >
        {lots ? (
          <LotTable offer={offer} order={order} />
        ) : (
          <div className="flex flex-wrap items-center justify-between gap-x-8 gap-y-6">
            <LadderDrawing rungs={rungs} need={line.toBuy} order={order} currency={offer.currency} />
            <div className="w-full grow desktop:w-auto desktop:max-w-[320px]">
              {line.toBuy > 0 && (
                <IfYouBuy
                  {...{ rungs, order }}
                  rate={supply.rateOf(offer.currency)}
                  currency={offer.currency}
                  reporting={plan.currency}
                  kits={plan.run.kits}
                />
              )}
            </div>
          </div>
        )}
      </Section>
    </Pair>
  );
}

function HowMany({ supply, line, shown }: { supply: KitSupply; line: PartLine; shown: Shown }) {
  const opens = useOpens();
  const basket = supply.run.baskets.find(({ supplier }) => supplier === shown.order?.supplier);
  const others = basket?.lines.filter(({ part }) => part !== line.id) ?? [];
  const partOf = (id: string) => supply.run.parts.find((one) => one.id === id);
  return (
    <>
      <MarginNote title={`How ${countText(line.toBuy)} comes about`}>
        <p>{howItComes(line, supply.plan.run.kits, shown.offer)}</p>
        <ShowWorking of={line.name} {...working(opens(`part:${line.id}`))} />
      </MarginNote>
      {basket && (
        <MarginNote title={`Also from ${basket.name}`}>
          <p>
            {others.length === 0
              ? "Nothing else comes in this parcel."
              : `${names(others.map(({ part }) => calledShort(partOf(part))))} ${others.length === 1 ? "comes" : "come"} in the same parcel.`}{" "}
            {freightText(basket)}
          </p>
        </MarginNote>
      )}
    </>
  );
}

function calledShort(line: PartLine | undefined): string {
  return line ? compressDesignators(line.designators.split(", ").filter(Boolean)) || line.name : "";
}

function freightText({ freight, currency, lines, freeFreightReached }: Basket): string {
  if (!freight.known) return "Its freight is not known.";
  if (freeFreightReached) return "The order is large enough for free freight.";
  if (!/[1-9]/.test(freight.value)) return "No freight is charged.";
  const shared = lines.length === 1 ? "falls on this line alone" : `is shared by ${lines.length} lines`;
  return `Freight of ${moneyText(freight.value, currency)} ${shared}.`;
}

function working({ open, onOpen, controls }: ReturnType<ReturnType<typeof useOpens>>) {
  return { open, onClick: onOpen, "aria-controls": open ? controls : undefined };
}

/** At most three names, and how many more. */
function names(all: readonly string[]): string {
  if (all.length <= 3)
    return all.length < 2 ? (all[0] ?? "") : `${all.slice(0, -1).join(", ")} and ${all.at(-1)}`;
  return `${all.slice(0, 3).join(", ")} and ${all.length - 3} more`;
}

function howItComes(line: PartLine, kits: number, { orderMultiple }: OfferView): string {
  const steps = [`${countText(kits)} kits: ${countText(line.need)}.`];
  if (line.spare > 0) steps.push(`Spare: ${countText(line.spare)}.`);
  if (line.fromStock > 0) steps.push(`From the shelf: ${countText(line.fromStock)}.`);
  if (orderMultiple > 1) steps.push(`Sold in multiples of ${countText(orderMultiple)}.`);
  return steps.join(" ");
}

/** The chart is fetched when it is needed. */
function useChart() {
  const [Chart, setChart] = useState<ComponentType<CurveChartProps>>();
  useEffect(() => {
    void import("./CurveChart.tsx").then((loaded) => setChart(() => loaded.default));
  }, []);
  return Chart;
}

function CurveSection({ part, line, shown }: { part: OfferPart; line: PartLine; shown: Shown }) {
  const Chart = useChart();
  const [asTable, setAsTable] = useState(false);
  const terms = termsOf(shown.offer);
  const never = neverWorthBuying(terms);
  const ranges = never.map(({ from, to }) =>
    from === to ? countText(from) : `${countText(from)} to ${countText(to)}`,
  );
  return (
    <Pair
      note={
        ranges.length > 0 && (
          <MarginNote title="Numbers never worth buying">
            <p>
              {names(ranges)}. The next break costs less than these. The thick line is what you pay; the
              hatched part is what you save.
            </p>
          </MarginNote>
        )
      }
    >
      <Section
        title="What any number costs"
        aside="at this supplier’s prices"
        actions={
          <ShowWorking
            of="what any number costs"
            open={asTable}
            label={asTable ? "Hide the table" : "Show as a table"}
            onClick={() => setAsTable(!asTable)}
          />
        }
      >
        <div className="min-h-[340px]">
          {Chart && (
            <Chart
              terms={terms}
              need={line.toBuy}
              order={shown.order}
              pieces={piecesOf(part)}
              asTable={asTable}
            />
          )}
        </div>
      </Section>
    </Pair>
  );
}
