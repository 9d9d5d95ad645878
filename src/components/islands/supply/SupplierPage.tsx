import { useQuery } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { moneyText } from "#src/components/amount-text.ts";
import { buttonLook } from "#src/components/button-look.ts";
import { CallFailed, call } from "#src/components/islands/call.ts";
import { Sheet } from "#src/components/islands/cells/Sheet.tsx";
import type { SheetStore } from "#src/components/islands/cells/use-sheet.ts";
import { offerColumns } from "#src/components/islands/offers/offer-columns.ts";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { Dialog } from "#src/components/islands/parts/Dialog.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { showToast } from "#src/components/islands/parts/toasts.ts";
import { pageCache, queryClient } from "#src/components/islands/query-client.ts";
import type { POST } from "#src/pages/api/workshops/[workshop]/offers.ts";
import type { GET } from "#src/pages/api/workshops/[workshop]/suppliers/[supplier]/offers.ts";
import type { OfferPart } from "#src/server/kit-offers.ts";
import type { OfferView } from "#src/server/offer-changes.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import type { OfferFields } from "#src/shapes/offer.ts";
import { SupplierForm } from "./SupplierForm.tsx";
import { changeSupplier, removeSupplier, useSuppliers } from "./suppliers-store.ts";
import { figuresChanged, supplyKeys } from "./supply-keys.ts";

export interface SupplierPageProps {
  workshop: string;
  supplier: string;
  suppliers: SupplierView[];
  /** Parts of the workshop that it offers. */
  parts: OfferPart[];
  offers: OfferView[];
  canChange: boolean;
  styleNonce: string;
}

function useSupplierOffers({ workshop, supplier, offers }: SupplierPageProps): OfferView[] {
  const { data } = useQuery(
    {
      queryKey: supplyKeys.supplierOffers(supplier),
      queryFn: () => call<typeof GET>("GET", `/api/workshops/${workshop}/suppliers/${supplier}/offers`),
      initialData: offers,
    },
    pageCache(),
  );
  return data;
}

/** The offers of one supplier as rows of a sheet. */
function offersOf(workshop: string, supplier: string): SheetStore<OfferView, OfferFields> {
  const key = supplyKeys.supplierOffers(supplier);
  const put = (changed: readonly OfferView[]) =>
    queryClient.setQueryData<OfferView[]>(key, (held) =>
      held?.map((offer) => changed.find(({ id }) => id === offer.id) ?? offer),
    );
  return {
    now: () => queryClient.getQueryData<OfferView[]>(key) ?? [],
    put,
    async save(changes) {
      const change = changes.map(({ id, version, change }) => ({ ...change, id, version }));
      const { changed } = await call<typeof POST>("POST", `/api/workshops/${workshop}/offers`, { change });
      figuresChanged();
      return changed;
    },
    refused(path) {
      const [, place = "0", ...at] = path.split(".");
      return { place: Number(place), at: at.join(".") };
    },
  };
}

/** One supplier: its terms in a form, and everything it offers. */
export default function SupplierPage(props: SupplierPageProps) {
  const { workshop, parts, canChange, styleNonce } = props;
  const suppliers = useSuppliers(workshop, props.suppliers);
  const offers = useSupplierOffers(props);
  const supplier = suppliers.find(({ id }) => id === props.supplier);
  const columns = useMemo(() => offerColumns({ parts, suppliers, offers }), [parts, suppliers, offers]);
  const store = useMemo(() => offersOf(workshop, props.supplier), [workshop, props.supplier]);
  if (!supplier) return <Question question="Which supplier?">This one is removed.</Question>;
  const home = `/workshops/${workshop}/suppliers`;
  return (
    <>
      <p className="type-note mb-3">
        <a href={home}>All suppliers</a>
      </p>
      <Question
        question={`What does ${supplier.name} offer, and on what terms?`}
        actions={
          canChange && (
            <a className={buttonLook()} href={`${home}/bring-in`}>
              Bring in a price list
            </a>
          )
        }
      >
        <b>{offers.length === 1 ? "One offer" : `${offers.length} offers`}.</b> {termsText(supplier)}
      </Question>
      <div className="flex flex-col gap-11">
        <Section title="Terms" aside={`in ${supplier.currency}, without VAT`}>
          {canChange ? (
            <Terms {...{ workshop, supplier, home }} offers={offers.length} />
          ) : (
            <p>{termsText(supplier)}</p>
          )}
        </Section>
        <Section title="Offers" aside="a block copied from a spreadsheet can be pasted into the cells">
          {offers.length === 0 ? (
            <p className="type-note py-3">
              None yet. Add them on the Offers page of a kit, or bring in a price list.
            </p>
          ) : (
            <Sheet
              label={`Offers of ${supplier.name}`}
              rows={offers}
              canEdit={canChange}
              nameOf={({ partId }) => parts.find(({ id }) => id === partId)?.name ?? "A part"}
              {...{ columns, store, styleNonce }}
            />
          )}
        </Section>
      </div>
    </>
  );
}

/** Freight, what frees an order from it, and the minimum, in a few sentences. */
function termsText(supplier: SupplierView): string {
  const { currency, freightTerm, freightAmount, freeFreightFrom, minimumOrderValue, leadTimeDays } = supplier;
  const freight =
    freightTerm === "flat" && freightAmount !== null
      ? `Freight is ${moneyText(freightAmount, currency)}`
      : freightTerm === "none"
        ? "No freight is charged"
        : "Freight is not known";
  const free =
    freightTerm === "flat" && freeFreightFrom !== null
      ? `, free from ${moneyText(freeFreightFrom, currency)}`
      : "";
  const least =
    minimumOrderValue === null ? "" : ` The minimum order is ${moneyText(minimumOrderValue, currency)}.`;
  const days = leadTimeDays === null ? "" : ` A parcel takes ${leadTimeDays} days.`;
  return `${freight}${free}.${least}${days}`;
}

interface TermsProps {
  workshop: string;
  supplier: SupplierView;
  home: string;
  offers: number;
}

function Terms({ workshop, supplier, home, offers }: TermsProps) {
  const [asking, setAsking] = useState(false);
  const { id, version, offers: _, ...first } = supplier;
  async function remove() {
    try {
      const gone = await removeSupplier(workshop, supplier);
      showToast({ kind: "good", text: `${supplier.name} is removed, with ${gone.offers} offers.` });
      location.assign(home);
    } catch (error) {
      if (!(error instanceof CallFailed)) throw error;
      setAsking(false);
      showToast({ kind: "fault", text: `${error.problem.title} ${error.problem.detail}` });
    }
  }
  return (
    <>
      <SupplierForm
        key={version}
        {...{ first, version }}
        action="Save the terms"
        onSave={async (fields, seen) => {
          await changeSupplier(workshop, { id, version: seen, change: fields });
          showToast({ kind: "good", text: `The terms of ${fields.name} are saved.` });
        }}
      />
      <Button kind="refuse" size="small" className="mt-5" onClick={() => setAsking(true)}>
        Remove the supplier
      </Button>
      <Dialog
        open={asking}
        title={`Remove ${supplier.name}?`}
        safe={{ label: "Keep it", run: () => setAsking(false) }}
        act={{ label: "Remove it", removes: true, run: () => void remove() }}
      >
        <p>
          {offers === 0
            ? "It makes no offers."
            : `${offers === 1 ? "Its one offer goes" : `Its ${offers} offers go`} with it, from every kit that uses ${offers === 1 ? "it" : "them"}.`}
        </p>
      </Dialog>
    </>
  );
}
