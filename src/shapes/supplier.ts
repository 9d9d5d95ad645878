import { z } from "zod";
import { checkMinorUnit, ListedCurrency } from "./currency.ts";
import { Amount } from "./decimal-text.ts";
import { LeadTimeDays, Name, Note, Version } from "./field.ts";
import * as limits from "./limits.ts";

/** What a person may set of a supplier; amounts are in the supplier's own currency, `null` is not known. */
export const SupplierFields = z.strictObject({
  name: Name,
  currency: ListedCurrency,
  freightTerm: z.enum(limits.FREIGHT_TERMS),
  freightAmount: Amount.nullable(),
  freeFreightFrom: Amount.nullable(),
  handlingFee: Amount,
  minimumOrderValue: Amount.nullable(),
  smallOrderTerm: z.enum(limits.SMALL_ORDER_TERMS),
  smallOrderFee: Amount.nullable(),
  leadTimeDays: LeadTimeDays.nullable(),
  note: Note,
});
export type SupplierFields = z.infer<typeof SupplierFields>;

const AMOUNTS = [
  "freightAmount",
  "freeFreightFrom",
  "handlingFee",
  "minimumOrderValue",
  "smallOrderFee",
] as const;

/** A whole supplier: terms that need an amount have one. Freight that is not known is its own term, never 0. */
export const Supplier = SupplierFields.superRefine(checkMinorUnit<SupplierFields>(AMOUNTS)).superRefine(
  (supplier, context) => {
    if (supplier.freightTerm === "flat" && supplier.freightAmount === null)
      context.addIssue({
        code: "custom",
        path: ["freightAmount"],
        message: "Flat freight needs its amount. If nobody knows it yet, choose that it is not known.",
      });
    if (supplier.smallOrderTerm === "fee" && supplier.smallOrderFee === null)
      context.addIssue({
        code: "custom",
        path: ["smallOrderFee"],
        message: "A fee for small orders needs its amount.",
      });
  },
);

export const NewSupplier = SupplierFields;
export const SupplierChange = SupplierFields.partial().extend({ version: Version });
