import { useState } from "react";
import { countText } from "#src/components/amount-text.ts";
import type { PricesView } from "#src/server/bring-in/list-offers.ts";
import type { PriceListView } from "#src/server/price-import.ts";
import { Button } from "../parts/Button.tsx";
import { StateIcon } from "../parts/Chip.tsx";
import { ChoiceField } from "../parts/ChoiceField.tsx";
import { Section } from "../parts/Section.tsx";
import { TextField } from "../parts/TextField.tsx";
import type { Edit } from "./use-import.ts";

interface Props {
  prices: PricesView | PriceListView;
  edit: (edit: Edit) => void;
}

const NOBODY = "nobody";
const NEW = "new";

function rowsWords(offers: number): string {
  if (offers === 1) return "The supplier and price of one row become an offer for its part.";
  return `Suppliers and prices of ${countText(offers)} rows become offers for their parts.`;
}

/** Prices in a list: whose they are, which suppliers they add, and what of them cannot be taken. */
export function PricesSection({ prices, edit }: Props) {
  const offers = "offers" in prices ? prices.offers : null;
  if (offers === 0 && prices.unnamed === 0) return null;
  return (
    <Section
      id="prices"
      title="Prices and suppliers"
      aside={offers === null ? "whose list it is" : undefined}
    >
      <div className="flex flex-col gap-3">
        {offers !== null && offers > 0 && <p>{rowsWords(offers)}</p>}
        {(offers === null || prices.unnamed > 0 || prices.pricesFrom !== null) && (
          <Whose prices={prices} edit={edit} />
        )}
        {prices.newSuppliers.length > 0 && (
          <p className="flex gap-3">
            <StateIcon kind="caution" className="mt-1 size-[18px]" />
            <span>
              {prices.newSuppliers.length === 1 ? "A supplier is added" : "Suppliers are added"}:{" "}
              <b>{prices.newSuppliers.join(", ")}</b>. Their freight is not known until you set it, and costs
              that need it say so.
            </span>
          </p>
        )}
        {prices.faults.map(({ at, message }) => (
          <p key={at + message} className="flex gap-3">
            <StateIcon kind="bad" className="mt-1 size-[18px]" />
            <span>
              <b>{faultPlace(at)}:</b> {message}
            </span>
          </p>
        ))}
      </div>
    </Section>
  );
}

/** "rows.15.breaks.1.price" is "Row 15, price of break 2". */
export function faultPlace(at: string): string {
  const [, row = "", field = "", place, part] = at.split(".");
  if (field === "breaks") return `Row ${row}, ${part ?? "price"} of break ${Number(place ?? 0) + 1}`;
  const words: Record<string, string> = {
    minimumOrder: "minimum order",
    orderMultiple: "order multiple",
    orderCode: "order code",
  };
  return `Row ${row}${field ? `, ${words[field] ?? field}` : ""}`;
}

function chosen(from: PricesView["pricesFrom"]): string {
  if (from === null) return NOBODY;
  return "id" in from ? from.id : NEW;
}

function Whose({ prices, edit }: Props) {
  const [naming, setNaming] = useState(false);
  const from = prices.pricesFrom;
  const value = naming ? NEW : chosen(from);
  const name = from !== null && "name" in from ? from.name : "";
  return (
    <div className="flex flex-wrap items-end gap-x-4 gap-y-3">
      <ChoiceField
        label={`Whose are the prices that name no supplier${prices.unnamed > 0 ? ` (${countText(prices.unnamed)})` : ""}?`}
        className="w-[min(420px,100%)]"
        value={value}
        leaveOut={NOBODY}
        choices={[
          { value: NOBODY, label: "Leave these prices out" },
          ...prices.suppliers.map(({ id, name: label }) => ({ value: id, label })),
          { value: NEW, label: name ? `${name} (new)` : "A new supplier" },
        ]}
        onChange={(change) => {
          const { value: picked } = change.currentTarget;
          setNaming(picked === NEW);
          if (picked === NOBODY) edit({ pricesFrom: null });
          else if (picked !== NEW) edit({ pricesFrom: { id: picked } });
        }}
      />
      {naming && (
        <NewName
          name={name}
          onName={(given) => {
            setNaming(false);
            edit({ pricesFrom: { name: given } });
          }}
        />
      )}
    </div>
  );
}

function NewName({ name, onName }: { name: string; onName: (name: string) => void }) {
  const [text, setText] = useState(name);
  const [wrong, setWrong] = useState<string>();
  return (
    <form
      className="flex flex-wrap items-end gap-3"
      onSubmit={(submit) => {
        submit.preventDefault();
        if (text.trim() === "") setWrong("Give the supplier a name.");
        else onName(text.trim());
      }}
    >
      <TextField
        label="Name of the supplier"
        value={text}
        wrong={wrong}
        onChange={(change) => setText(change.currentTarget.value)}
      />
      <Button type="submit">Use this name</Button>
    </form>
  );
}
