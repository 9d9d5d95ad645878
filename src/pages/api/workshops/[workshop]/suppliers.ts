import { route } from "#src/server/route.ts";
import { addSupplier, suppliers } from "#src/server/supplier-changes.ts";
import { NewSupplier } from "#src/shapes/supplier.ts";

/** The suppliers of the workshop, by name. */
export const GET = route({ may: "see-money", run: suppliers });

/** Adds a supplier. */
export const POST = route({
  may: "change-supply",
  input: NewSupplier,
  status: 201,
  run: (given) => addSupplier(given, given.input),
});
