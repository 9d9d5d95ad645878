import { useMemo } from "react";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { PAIRS } from "#src/components/page-look.ts";
import type { PartLine } from "#src/costing/run-result.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import { CurveSection } from "./CurveSection.tsx";
import { type KitSupply, type KitSupplyProps, useKitSupply } from "./kit-supply.ts";
import { LadderSection, type ShownOffer } from "./LadderSection.tsx";
import { OffersSection } from "./OffersSection.tsx";
import { offerAnswer } from "./offer-answer.ts";
import { thePart } from "./offer-words.ts";
import { PartSteps } from "./PartSteps.tsx";

export type OfferPageProps = KitSupplyProps & { part: string };

/** One part of a kit: who supplies it, how many are bought, and what any other number would cost. */
export default function OfferPage(props: OfferPageProps) {
  const supply = useKitSupply(props);
  const part = supply.parts.find(({ id }) => id === props.part);
  const line = supply.run.parts.find(({ id }) => id === props.part);
  const shown = useShown(supply, line);
  if (!part || !line) return <Question question="Which part?">This line is no longer in the list.</Question>;
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
        {shown && shown.offer.breaks.length > 0 && (
          <CurveSection
            {...{ part, line }}
            terms={shown.terms}
            order={shown.order}
            supplier={supply.nameOf(shown.offer.supplierId)}
          />
        )}
      </div>
    </>
  );
}

/** The chosen offer, or the first that has a price. */
function useShown(supply: KitSupply, line: PartLine | undefined): ShownOffer | null {
  const order = line?.orders[0] ?? null;
  const id = order?.offer ?? line?.considered.find(({ standing }) => standing !== "no-price")?.offer;
  const offer = supply.offers.find((one) => one.id === id);
  const terms = useMemo(() => offer && termsOf(offer), [offer]);
  return offer && terms ? { offer, terms, order: line?.orders.length === 1 ? order : null } : null;
}

function termsOf({ priceModel, currency, breaks, minimumOrder, orderMultiple }: OfferView) {
  return { priceModel, currency, breaks, minimumOrder, orderMultiple };
}
