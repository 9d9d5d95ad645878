import { useMemo, useState } from "react";
import { buttonLook } from "#src/components/button-look.ts";
import { Sheet } from "#src/components/islands/cells/Sheet.tsx";
import { Button } from "#src/components/islands/parts/Button.tsx";
import { MarginNote, Pair } from "#src/components/islands/parts/Pair.tsx";
import { Question } from "#src/components/islands/parts/Question.tsx";
import { Section } from "#src/components/islands/parts/Section.tsx";
import { PAIRS } from "#src/components/page-look.ts";
import type { RateView } from "#src/server/currency-rate-changes.ts";
import type { SupplierView } from "#src/server/supplier-changes.ts";
import { Rates } from "./Rates.tsx";
import { useRates } from "./rates-store.ts";
import { blankSupplier, SupplierForm } from "./SupplierForm.tsx";
import { supplierColumns } from "./supplier-columns.ts";
import { addSupplier, suppliersStore, useSuppliers } from "./suppliers-store.ts";

export interface SuppliersProps {
  workshop: string;
  /** What the workshop reckons in. */
  reporting: string;
  suppliers: SupplierView[];
  rates: RateView[];
  /** Currencies of board quotes; suppliers' own are known here. */
  quoted: string[];
  today: string;
  canChange: boolean;
  /** Whether the settings name an address of reference rates. */
  canFetchRates: boolean;
  styleNonce: string;
}

/** The suppliers of a workshop: a sheet of their terms, a form for a new one, and the currency rates. */
export default function Suppliers(props: SuppliersProps) {
  const { workshop, reporting, today, canChange, styleNonce } = props;
  const suppliers = useSuppliers(workshop, props.suppliers);
  const rates = useRates(workshop, props.rates);
  const [adding, setAdding] = useState(suppliers.length === 0 && canChange);
  const base = `/workshops/${workshop}/suppliers`;
  const columns = useMemo(() => supplierColumns(base), [base]);
  const store = useMemo(() => suppliersStore(workshop), [workshop]);
  const used = [...new Set([...suppliers.map(({ currency }) => currency), ...props.quoted])].sort();
  return (
    <>
      <Question
        question="Whom do we buy from?"
        actions={canChange && <Ways base={base} onAdd={() => setAdding(true)} />}
      >
        <Answer suppliers={suppliers} />
      </Question>
      <div className="flex flex-col gap-11">
        {adding && (
          <Section title="A new supplier">
            <SupplierForm
              first={blankSupplier(reporting)}
              version={0}
              action="Add the supplier"
              onLeave={suppliers.length > 0 ? () => setAdding(false) : undefined}
              onSave={async (fields) => {
                await addSupplier(workshop, fields);
                setAdding(false);
              }}
            />
          </Section>
        )}
        {suppliers.length > 0 && (
          <Section title="Terms" aside="each in the supplier’s own currency, without VAT">
            <Sheet
              label="Suppliers"
              rows={suppliers}
              nameOf={({ name }) => name}
              canEdit={canChange}
              {...{ columns, store, styleNonce }}
            />
          </Section>
        )}
        <div className={PAIRS}>
          <Pair note={<RateNote />}>
            <Rates
              {...{ workshop, reporting, rates, used, today, canChange }}
              canFetch={props.canFetchRates}
            />
          </Pair>
        </div>
      </div>
    </>
  );
}

function Ways({ base, onAdd }: { base: string; onAdd: () => void }) {
  return (
    <>
      <Button onClick={onAdd}>Add a supplier</Button>
      <a className={buttonLook()} href={`${base}/bring-in`}>
        Bring in a price list
      </a>
    </>
  );
}

function Answer({ suppliers }: { suppliers: readonly SupplierView[] }) {
  if (suppliers.length === 0) return "Nobody yet. Add the first supplier, or bring in a price list.";
  const offers = suppliers.reduce((sum, supplier) => sum + supplier.offers, 0);
  const open = suppliers.filter(({ freightTerm }) => freightTerm === "not-known");
  const names = open.map(({ name }) => name).join(", ");
  return (
    <>
      <b>
        {suppliers.length === 1 ? "One supplier" : `${suppliers.length} suppliers`} with {offers}{" "}
        {offers === 1 ? "offer" : "offers"}.
      </b>{" "}
      {open.length > 0 &&
        `Freight is not known for ${names}, so what an order there costs is not known either.`}
    </>
  );
}

function RateNote() {
  return (
    <MarginNote title="Rates are yours">
      <p>
        A rate holds from its day until the next. Reference rates come as the XML file of the European Central
        Bank; what your bank charges may differ, and a rate you set yourself says so.
      </p>
    </MarginNote>
  );
}
