import { countText, moneyText } from "#src/components/amount-text.ts";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { ShowWorking } from "#src/components/islands/parts/ShowWorking.tsx";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import type { LadderTerms } from "#src/costing/ladder.ts";
import { rungOrders } from "#src/costing/order-curve.ts";
import type { Basket, PartLine, PartOrder } from "#src/costing/run-result.ts";
import { compressDesignators } from "#src/partslist/designators.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import { howItComes, namesInWords } from "./how-it-comes.ts";
import { IfYouBuy } from "./IfYouBuy.tsx";
import type { KitSupply } from "./kit-supply.ts";
import { LadderDrawing } from "./LadderDrawing.tsx";
import { LotTable } from "./LotTable.tsx";

/** The offer whose ladder is drawn: the chosen one, or the best there is. */
export interface ShownOffer {
  offer: OfferView;
  terms: LadderTerms;
  order: PartOrder | null;
}

interface LadderSectionProps {
  supply: KitSupply;
  line: PartLine;
  shown: ShownOffer;
}

/** The price ladder of the offer, and what each way of covering the need comes to. */
export function LadderSection({ supply, line, shown }: LadderSectionProps) {
  const { offer, terms, order } = shown;
  const name = supply.nameOf(offer.supplierId);
  const lots = offer.priceModel === "lots";
  const rungs = lots || offer.breaks.length === 0 ? [] : rungOrders(terms, Math.max(1, line.toBuy));
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
            <div className="w-full grow tablet:w-auto tablet:max-w-[320px]">
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

function HowMany({ supply, line, shown }: LadderSectionProps) {
  const opens = useOpens();
  const { open, onOpen, controls } = opens(`part:${line.id}`);
  const basket = supply.run.baskets.find(({ supplier }) => supplier === shown.order?.supplier);
  const part = supply.plan.parts.find(({ id }) => id === line.id);
  return (
    <>
      <MarginNote title={`How ${countText(line.toBuy)} comes about`}>
        {part && (
          <p>
            {howItComes({
              line,
              part,
              editions: supply.run.editions,
              orderMultiple: shown.offer.orderMultiple,
            })}
          </p>
        )}
        <ShowWorking
          of={line.name}
          open={open}
          onClick={onOpen}
          aria-controls={open ? controls : undefined}
        />
      </MarginNote>
      {basket && <SameParcel {...{ supply, line, basket }} />}
    </>
  );
}

function SameParcel({ supply, line, basket }: { supply: KitSupply; line: PartLine; basket: Basket }) {
  const others = basket.lines.filter(({ part }) => part !== line.id);
  const called = others.map(({ part }) => calledShort(supply.run.parts.find(({ id }) => id === part)));
  return (
    <MarginNote title={`Also from ${basket.name}`}>
      <p>
        {others.length === 0
          ? "Nothing else comes in this parcel."
          : `${namesInWords(called)} ${others.length === 1 ? "comes" : "come"} in the same parcel.`}{" "}
        {freightText(basket)}
      </p>
    </MarginNote>
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
