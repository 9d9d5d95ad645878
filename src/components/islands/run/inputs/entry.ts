import type { KitAddress } from "#src/components/islands/kit-address.ts";
import { editField } from "#src/components/islands/plan/edit-plan.ts";
import { changeWords, fieldName } from "#src/components/islands/plan/field-words.ts";
import type { PlanRow } from "#src/components/islands/plan/plan-rows.ts";

/** Where an entry of the run page goes. */
export interface Entry {
  address: KitAddress;
  row: PlanRow;
  field: string;
  currency: string;
  /** The thing a row is about: "Full kit", "Testing". */
  thing?: string;
}

/** Takes a new value of an entry: figures follow at once, it is saved soon, and can be taken back. */
export function take({ address, row, field, currency, thing }: Entry, value: unknown): void {
  const name = (from: unknown) => changeWords(fieldName(row, field, thing), field, from, value, currency);
  editField(address, { row, field, value, name });
}
