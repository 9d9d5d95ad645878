import { route } from "#src/server/route.ts";
import { shutOutSupplier } from "#src/server/supplier-changes.ts";

/** Has the kit do without a supplier. */
export const PUT = route({
  may: "change-run",
  run: (given) => shutOutSupplier(given, given.params.supplier ?? "", true),
});

/** Lets the kit buy from the supplier again. */
export const DELETE = route({
  may: "change-run",
  run: (given) => shutOutSupplier(given, given.params.supplier ?? "", false),
});
