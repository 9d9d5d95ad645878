import { z } from "zod";
import { ListedCurrency } from "./currency.ts";
import { Name, Version } from "./field.ts";

/** A workshop's settings. */
export interface WorkshopSettings {
  id: string;
  name: string;
  /** Reporting currency, ISO 4217. */
  currency: string;
  /** Cost of an hour's own work in it, exact decimal text; `null`: not decided. */
  ratePerHour: string | null;
  version: number;
}

export const NewWorkshop = z.strictObject({ name: Name, currency: ListedCurrency });

export const WorkshopChange = z.strictObject({
  name: Name.optional(),
  currency: ListedCurrency.optional(),
  version: Version,
});
export type WorkshopChange = z.infer<typeof WorkshopChange>;

/** The name, typed, so that a workshop is not deleted by one wrong click. */
export const WorkshopRemoval = z.strictObject({ name: z.string() });
