import { route } from "#src/server/route.ts";
import { changeSupplier, removeSupplier, supplier } from "#src/server/supplier-changes.ts";
import { RemovalQuery } from "#src/shapes/field.ts";
import { SupplierChange } from "#src/shapes/supplier.ts";

/** One supplier with the number of its offers. */
export const GET = route({
  may: "see-money",
  run: (given) => supplier(given, given.params.supplier ?? ""),
});

/** Changes a supplier's terms. */
export const PATCH = route({
  may: "change-supply",
  input: SupplierChange,
  run: (given) => changeSupplier(given, given.params.supplier ?? "", given.input),
});

/** Removes a supplier with its offers, and says how many they were. */
export const DELETE = route({
  may: "change-supply",
  query: RemovalQuery,
  run: (given) => removeSupplier(given, given.params.supplier ?? "", given.query.version),
});
