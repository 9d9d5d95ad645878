import { useMemo, useState } from "react";
import { countText, moneyText } from "#src/components/amount-text.ts";
import { buttonLook } from "#src/components/button-look.ts";
import { Sheet } from "#src/components/islands/cells/Sheet.tsx";
import { kitPath } from "#src/components/islands/kit-address.ts";
import { FilterGroup } from "#src/components/islands/parts/FilterGroup.tsx";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { SettleList } from "#src/components/islands/parts/SettleList.tsx";
import { PAIRS } from "#src/components/page-look.ts";
import { withoutWords } from "#src/costing/problem-words.ts";
import type { KitOffers, OfferPart } from "#src/server/kit-offers.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import { type KitSupply, type KitSupplyProps, useKitSupply } from "./kit-supply.ts";
import { LinesTable, lineMark } from "./LinesTable.tsx";
import { OrdersTable } from "./OrdersTable.tsx";
import { offerColumns } from "./offer-columns.ts";
import { offersSheet } from "./offers-store.ts";
import { type OfferMatter, offerMatters, singleSourced } from "./settle-offers.ts";

export type OffersOverviewProps = KitSupplyProps & { styleNonce: string };

/** Who supplies a kit's parts: what is settled, what is not, the orders, and every offer in a sheet. */
export default function OffersOverview(props: OffersOverviewProps) {
  const supply = useKitSupply(props);
  const { address, today, canChoose } = props;
  const suppliersHref = `/workshops/${address.workshop}/suppliers`;
  const matters = offerMatters(supply, today, suppliersHref);
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
        <Answer supply={supply} />
      </Question>
      <div className={PAIRS}>
        <Pair note={<Matters matters={matters} supply={supply} />}>
          <Lines supply={supply} today={today} />
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
        <Everything {...{ props, supply }} />
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

function Answer({ supply: { run, plan } }: { supply: KitSupply }) {
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
      {parcels > 0 && `They come in ${parcels === 1 ? "one parcel" : `${parcels} parcels`}.`}
    </>
  );
}

function Matters({ matters, supply }: { matters: readonly OfferMatter[]; supply: KitSupply }) {
  const single = singleSourced(supply);
  return (
    <>
      <MarginNote title={matters.length === 0 ? "Nothing to settle" : `To settle, ${matters.length}`}>
        {matters.length === 0 ? (
          <p>Every part has a fresh price and enough in stock.</p>
        ) : (
          <SettleList
            label="To settle"
            items={matters.map(({ key, kind, sentence, way, href }) => ({
              key,
              kind,
              text: (
                <>
                  {sentence} <a href={href}>{way}</a>
                </>
              ),
            }))}
          />
        )}
      </MarginNote>
      {single.length > 0 && (
        <MarginNote title="From one supplier alone">
          <p>
            {single.map(({ id, name }, place) => (
              <span key={id}>
                {place > 0 && ", "}
                <a href={supply.partHref(id)}>{name}</a>
              </span>
            ))}
            . If that supplier runs out, the run waits.
          </p>
        </MarginNote>
      )}
    </>
  );
}

type Filter = "all" | "open" | "look";

function Lines({ supply, today }: { supply: KitSupply; today: string }) {
  const [filter, setFilter] = useState<Filter>("all");
  const kindOf = (part: OfferPart) => {
    const line = supply.run.parts.find(({ id }) => id === part.id);
    return line ? lineMark(supply, line, today).kind : "plain";
  };
  const open = supply.parts.filter((part) => kindOf(part) === "bad");
  const look = supply.parts.filter((part) => kindOf(part) === "caution");
  const shown = filter === "all" ? supply.parts : filter === "open" ? open : look;
  return (
    <Section
      title="Lines"
      aside={`what ${countText(supply.plan.run.kits)} kits need, without VAT`}
      actions={
        open.length + look.length > 0 && (
          <FilterGroup
            label="Lines shown"
            value={filter}
            onChoose={(value) => setFilter(value as Filter)}
            choices={[
              { value: "all", label: "All", count: supply.parts.length },
              { value: "open", label: "To settle", count: open.length },
              { value: "look", label: "Worth a look", count: look.length },
            ]}
          />
        )
      }
    >
      {shown.length === 0 ? (
        <p className="type-note py-3">None.</p>
      ) : (
        <LinesTable {...{ supply, today }} parts={shown} />
      )}
    </Section>
  );
}

/** Offers in the order of the list, then by supplier. */
function inListOrder({ parts, suppliers, offers }: KitOffers): OfferView[] {
  const placeOf = new Map(parts.map(({ id }, place) => [id, place]));
  const nameOf = new Map(suppliers.map(({ id, name }) => [id, name]));
  return [...offers].sort(
    (a, b) =>
      (placeOf.get(a.partId) ?? 0) - (placeOf.get(b.partId) ?? 0) ||
      (nameOf.get(a.supplierId) ?? "").localeCompare(nameOf.get(b.supplierId) ?? "") ||
      a.id.localeCompare(b.id),
  );
}

/** Every offer in one sheet, for editing and pasting. */
function Everything({ props, supply }: { props: OffersOverviewProps; supply: KitSupply }) {
  const { address, canChange, styleNonce } = props;
  const { parts, suppliers, offers } = supply;
  // biome-ignore lint/correctness/useExhaustiveDependencies: the links depend on the address alone.
  const columns = useMemo(
    () => offerColumns({ parts, suppliers, offers }, supply.partHref),
    [parts, suppliers, offers, address.kit],
  );
  const store = useMemo(() => offersSheet(address), [address]);
  const rows = useMemo(() => inListOrder({ parts, suppliers, offers }), [parts, suppliers, offers]);
  const nameOf = ({ partId, supplierId }: (typeof offers)[number]) =>
    `${parts.find(({ id }) => id === partId)?.name ?? "A part"} from ${supply.nameOf(supplierId)}`;
  return (
    <Section
      title="Every offer"
      aside="a block copied from a spreadsheet can be pasted into the cells"
      id="every-offer"
    >
      {offers.length === 0 ? (
        <p className="type-note py-3">No offers yet. Open a line and add one, or bring in a price list.</p>
      ) : (
        <Sheet
          label="Every offer"
          rows={rows}
          canEdit={canChange}
          {...{ columns, nameOf, store, styleNonce }}
        />
      )}
    </Section>
  );
}
