import { useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import { CallFailed } from "#src/components/islands/call.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { CheckBox } from "#src/components/islands/parts/CheckBox.tsx";
import { Dialog } from "#src/components/islands/parts/Dialog.tsx";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { useOpens } from "#src/components/islands/plan/open-working.ts";
import { problemSentence } from "#src/costing/problem-words.ts";
import type { PartLine } from "#src/costing/run-result.ts";
import type { OfferPart } from "#src/server/kit-offers.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import { chooseFor } from "./choose-offer.ts";
import type { KitSupply, KitSupplyProps } from "./kit-supply.ts";
import { blankOffer, OfferForm, offerFields } from "./OfferForm.tsx";
import { OfferTable, type ReckonedOffer } from "./OfferTable.tsx";
import { lineText } from "./offer-words.ts";
import { addOffer, changeOffer, removeOffer } from "./offers-store.ts";

interface OffersSectionProps {
  props: KitSupplyProps;
  supply: KitSupply;
  part: OfferPart;
  line: PartLine;
}

/** The offers for a part in a table, and the form in which one is added or changed. */
export function OffersSection({ props, supply, part, line }: OffersSectionProps) {
  const { address, today, canChange, canChoose } = props;
  const [open, setOpen] = useState<"new" | string | null>(null);
  const opens = useOpens();
  const planned = supply.plan.parts.find(({ id }) => id === part.id);
  const rows = rowsOf(supply, line, part);
  const edited = supply.offers.find(({ id }) => id === open);
  const pin = (offer: string | null) => {
    const name = supply.nameOf(rows.find((row) => row.offer.id === offer)?.offer.supplierId ?? "");
    const words = offer === null ? "the cheapest offer is taken" : `always from ${name}`;
    void chooseFor(address, part.id, { pinnedOffer: offer }, `${lineText(part)}: ${words}.`);
  };
  const onlyFromStock = planned?.onlyFromStock ?? false;
  return (
    <Pair note={<Notes {...{ supply, part }} />}>
      <Section
        title={line.toBuy > 0 ? `Offers for ${countText(line.toBuy)}` : "Offers"}
        aside="cheapest first, freight counted as if it came alone; prices without VAT"
        id="offers"
        actions={
          canChange && (
            <Button size="small" onClick={() => setOpen("new")}>
              Add an offer
            </Button>
          )
        }
      >
        {open === "new" && <NewOffer {...{ props, supply, part }} onDone={() => setOpen(null)} />}
        {edited && (
          <EditedOffer key={edited.id} {...{ props, supply }} offer={edited} onDone={() => setOpen(null)} />
        )}
        {rows.length === 0 ? (
          <p className="type-note py-3">Nobody has offered this part yet.</p>
        ) : (
          <OfferTable
            caption={`Offers for ${part.name}`}
            pinned={planned?.pinnedOffer ?? null}
            supplierHref={supply.supplierHref}
            reporting={supply.plan.currency}
            rateOf={supply.rateOf}
            workingOf={({ offer, chosen }) => opens(chosen ? `part:${part.id}` : `offer:${part.id}:${offer}`)}
            onPin={pin}
            onEdit={({ id }) => setOpen(id)}
            {...{ rows, today, canChoose, canChange }}
          />
        )}
        {canChoose && rows.length > 0 && (
          <CheckBox
            className="mt-3"
            label="Only from the stock shown"
            hint="Offers that show no stock, or too little, are then left aside."
            checked={onlyFromStock}
            onChange={() =>
              void chooseFor(
                address,
                part.id,
                { onlyFromStock: !onlyFromStock },
                `${lineText(part)}: ${onlyFromStock ? "orders beyond the stock shown are allowed" : "only from stock"}.`,
              )
            }
          />
        )}
      </Section>
    </Pair>
  );
}

/** In the order of the reckoning; an offer it has not seen yet comes last. */
function rowsOf(supply: KitSupply, line: PartLine, part: OfferPart): ReckonedOffer[] {
  return line.considered.flatMap((considered) => {
    const offer = supply.offers.find(({ id, partId }) => id === considered.offer && partId === part.id);
    return offer ? [{ offer, considered, supplier: supply.supplier(offer.supplierId) }] : [];
  });
}

/** What the reckoning has to say about this part's offers. */
function Notes({ supply, part }: { supply: KitSupply; part: OfferPart }) {
  const about = supply.run.problems.filter(({ at }) => at.part === part.id);
  if (about.length === 0) return null;
  const sentences = [...new Set(about.map((problem) => problemSentence(problem, supply.plan)))];
  return (
    <MarginNote title={sentences.length === 1 ? "Worth knowing" : "Worth knowing first"}>
      {sentences.map((sentence) => (
        <p key={sentence}>{sentence}</p>
      ))}
    </MarginNote>
  );
}

function suppliersHref({ address }: KitSupplyProps): string {
  return `/workshops/${address.workshop}/suppliers`;
}

type Doing = Pick<OffersSectionProps, "props" | "supply"> & { onDone: () => void };

function NewOffer({ props, supply, part, onDone }: Doing & { part: OfferPart }) {
  const [first] = supply.suppliers;
  if (!first)
    return (
      <p className="type-note py-3">
        An offer needs a supplier. <a href={suppliersHref(props)}>Add the first supplier</a>.
      </p>
    );
  return (
    <div className="mb-6 border-l-4 border-petrol pl-5">
      <OfferForm
        first={blankOffer(first, props.today)}
        version={0}
        suppliers={supply.suppliers}
        suppliersHref={suppliersHref(props)}
        action="Add the offer"
        onLeave={onDone}
        onSave={async (fields) => {
          await addOffer(props.address, part.id, fields);
          onDone();
        }}
      />
    </div>
  );
}

function EditedOffer({ props, supply, offer, onDone }: Doing & { offer: OfferView }) {
  const [asking, setAsking] = useState(false);
  const name = supply.nameOf(offer.supplierId);
  return (
    <div className="mb-6 border-l-4 border-petrol pl-5">
      <OfferForm
        first={offerFields(offer)}
        version={offer.version}
        suppliers={supply.suppliers}
        suppliersHref={suppliersHref(props)}
        action="Save the offer"
        onLeave={onDone}
        onSave={async (fields, version) => {
          await changeOffer(props.address, { id: offer.id, version }, fields);
          onDone();
        }}
      />
      <Button kind="refuse" size="small" className="mt-4" onClick={() => setAsking(true)}>
        Remove the offer
      </Button>
      <Dialog
        open={asking}
        title={`Remove the offer of ${name}?`}
        safe={{ label: "Keep it", run: () => setAsking(false) }}
        act={{
          label: "Remove it",
          removes: true,
          run: () => void removed(props, offer, () => setAsking(false)).then((gone) => gone && onDone()),
        }}
      >
        <p>Every kit that uses this part loses the offer. Its price breaks go with it.</p>
      </Dialog>
    </div>
  );
}

async function removed(props: KitSupplyProps, offer: OfferView, close: () => void): Promise<boolean> {
  try {
    await removeOffer(props.address, offer);
    return true;
  } catch (error) {
    if (!(error instanceof CallFailed)) throw error;
    showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
    return false;
  } finally {
    close();
  }
}
