import { useMemo, useState } from "react";
import { CallFailed } from "#src/components/islands/call.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { ErrorBox } from "#src/components/islands/parts/ErrorBox.tsx";
import { FilterGroup } from "#src/components/islands/parts/FilterGroup.tsx";
import { Loading } from "#src/components/islands/parts/Loading.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { usePlan } from "#src/components/islands/plan/use-plan.ts";
import { priceForAim } from "#src/costing/price/price-for-aim.ts";
import { yieldsAt } from "#src/costing/price/price-yields.ts";
import type { Plan, PlanEdition } from "#src/shapes/plan.ts";
import { AskedPrice, type WhoPrices } from "./AskedPrice.tsx";
import { OtherPrices } from "./OtherPrices.tsx";
import { PriceAnswer } from "./PriceAnswer.tsx";
import { PriceEvidence } from "./PriceEvidence.tsx";
import { pricingOf } from "./pricing-of.ts";

export interface PricePageProps {
  workshop: string;
  kit: string;
  who: WhoPrices;
  may: { changeRun: boolean; changePrice: boolean };
}

/** What should we ask for a kit? The price, what every channel leaves of it, and which price does what. */
export default function PricePage({ workshop, kit, who, may }: PricePageProps) {
  const address = useMemo(() => ({ workshop, kit }), [workshop, kit]);
  const { held, error, retry } = usePlan(address);
  if (held) return <Priced {...{ address, who, may }} plan={held.plan} />;
  return (
    <>
      <Question question="What should we ask for a kit?">{error ? "" : "Working out."}</Question>
      {error ? (
        <ErrorBox title="The plan could not be fetched" alert>
          <p>
            {error instanceof CallFailed ? `${error.problem.title} ${error.problem.detail}` : error.message}
          </p>
          <Button className="mt-3" onClick={retry}>
            Try again
          </Button>
        </ErrorBox>
      ) : (
        <Loading what="prices and channels" rows={8} />
      )}
    </>
  );
}

interface PricedProps extends Pick<PricePageProps, "who" | "may"> {
  address: { workshop: string; kit: string };
  plan: Plan;
}

/** The edition in view: the one chosen, else the one most of the run is made of. */
function inView(plan: Plan, chosen: string | null): PlanEdition {
  const found = plan.editions.find(({ id }) => id === chosen);
  return found ?? plan.editions.reduce((one, other) => (other.weight > one.weight ? other : one));
}

function Priced({ address, plan, who, may }: PricedProps) {
  const [chosen, setChosen] = useState<string | null>(null);
  const opens = useOpens();
  const edition = inView(plan, chosen);
  const context = pricingOf(plan);
  const scope = { edition: edition.id, channel: null };
  const yields = yieldsAt(context, scope);
  // No loss on the next kit rests on all that every other aim rests on.
  const next = priceForAim(context, scope, { aim: "next-kit" });
  const solved = next.found || next.problem !== null;
  const props = { address, context, edition, mayChange: may.changePrice };
  const named = plan.editions.length > 1;
  return (
    <>
      <PriceAnswer {...{ edition, yields, opens, solved, named }} currency={plan.currency} />
      {named && (
        <div className="mb-6">
          <FilterGroup
            label="Edition"
            choices={plan.editions.map(({ id, name }) => ({ value: id, label: name }))}
            value={edition.id}
            onChoose={setChosen}
          />
        </div>
      )}
      <div className="mb-11 grid gap-x-11 gap-y-6 desktop:grid-cols-[300px_minmax(0,1fr)] desktop:items-end">
        <AskedPrice {...props} who={who} />
        <OtherPrices {...props} />
      </div>
      <PriceEvidence {...props} {...{ yields, solved, may, opens }} />
    </>
  );
}
