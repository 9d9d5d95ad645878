import { useState } from "react";
import { countText, moneyText } from "#src/components/amount-text.ts";
import { buttonLook } from "#src/components/button-look.ts";
import { counted } from "#src/components/count-words.ts";
import { kitPath } from "#src/components/islands/kit-address.ts";
import { FilterGroup } from "#src/components/islands/parts/FilterGroup.tsx";
import { Pair } from "#src/components/islands/parts/Pair.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { PAIRS } from "#src/components/page-look.ts";
import { withoutWords } from "#src/costing/problem-words.ts";
import type { OpenThing } from "#src/costing/to-settle.ts";
import { EveryOffer } from "./EveryOffer.tsx";
import { type KitSupply, type KitSupplyProps, useKitSupply } from "./kit-supply.ts";
import { LinesTable } from "./LinesTable.tsx";
import { OfferNotes } from "./OfferNotes.tsx";
import { OrdersTable } from "./OrdersTable.tsx";
import { offerNotes, offerThings, singleSourced } from "./settle-offers.ts";

export type OffersOverviewProps = KitSupplyProps & { styleNonce: string };

/** Who supplies a kit's parts: what is settled, what is not, the orders, and every offer in a sheet. */
export default function OffersOverview(props: OffersOverviewProps) {
  const supply = useKitSupply(props);
  const { address, canChoose } = props;
  const suppliersHref = `/workshops/${address.workshop}/suppliers`;
  const things = offerThings(supply);
  if (supply.parts.length === 0) return <NoParts partsHref={kitPath(address, "/parts")} />;
  return (
    <>
      <Question
        question="Who supplies the parts?"
        actions={
          <a className={buttonLook()} href={`${suppliersHref}/bring-in`}>
            Bring in a price list
          </a>
        }
      >
        <Answer supply={supply} open={things.length} />
      </Question>
      <div className={PAIRS}>
        <Pair note={<OfferNotes {...{ address, supply, things }} />}>
          <Lines {...{ supply, things }} />
        </Pair>
        {supply.run.baskets.length > 0 && (
          <Pair>
            <Section
              title="Orders"
              aside={`for ${countText(supply.plan.run.kits)} kits, each in its supplier’s currency`}
            >
              <OrdersTable {...{ address, supply, canChoose }} />
            </Section>
          </Pair>
        )}
      </div>
      <div className="mt-11">
        <EveryOffer
          {...{ address, supply }}
          today={props.today}
          canChange={props.canChange}
          styleNonce={props.styleNonce}
        />
      </div>
    </>
  );
}

function NoParts({ partsHref }: { partsHref: string }) {
  return (
    <Question question="Who supplies the parts?">
      Nothing yet. The list has no parts to buy: <a href={partsHref}>bring in a parts list</a>.
    </Question>
  );
}

function Answer({ supply: { run, plan }, open: toSettle }: { supply: KitSupply; open: number }) {
  const bought = run.parts.filter(({ state }) => state !== "not-needed");
  const settled = bought.filter(({ state }) => state === "settled");
  const goods = run.heads.find(({ id }) => id === "parts")?.spent;
  const parcels = run.baskets.length;
  const open = bought.length - settled.length;
  const amount = goods && (goods.known ? goods.value : goods.without);
  return (
    <>
      <b>
        {open === 0
          ? `All ${countText(bought.length)} parts have a supplier`
          : `${countText(open)} of ${countText(bought.length)} parts have none that will do`}
        {amount ? `: ${moneyText(amount, run.currency)} for ${countText(plan.run.kits)} kits` : ""}
        {goods && !goods.known && goods.without !== null ? `, ${withoutWords(goods.needs)}` : ""}.
      </b>{" "}
      {parcels > 0 && `They come in ${parcels === 1 ? "one parcel" : `${parcels} parcels`}. `}
      {toSettle > 0 && `${counted(toSettle, "thing is", "things are")} to settle.`}
    </>
  );
}

type Filter = "all" | "open" | "notes";

function Lines({ supply, things }: { supply: KitSupply; things: readonly OpenThing[] }) {
  const [filter, setFilter] = useState<Filter>("all");
  const noted = [
    ...offerNotes(supply).map(({ at }) => at.part),
    ...singleSourced(supply).map(({ id }) => id),
  ];
  const open = supply.parts.filter(({ id }) => things.some(({ at }) => at.part === id));
  const notes = supply.parts.filter(({ id }) => noted.includes(id));
  const shown = filter === "all" ? supply.parts : filter === "open" ? open : notes;
  return (
    <Section
      title="Lines"
      aside={`what ${countText(supply.plan.run.kits)} kits need, without VAT`}
      actions={
        open.length + notes.length > 0 && (
          <FilterGroup
            label="Lines shown"
            value={filter}
            onChoose={(value) => setFilter(value as Filter)}
            choices={[
              { value: "all", label: "All", count: supply.parts.length },
              { value: "open", label: "To settle", count: open.length },
              { value: "notes", label: "Worth knowing", count: notes.length },
            ]}
          />
        )
      }
    >
      {shown.length === 0 ? (
        <p className="type-note py-3">None.</p>
      ) : (
        <LinesTable {...{ supply, things }} parts={shown} />
      )}
    </Section>
  );
}
