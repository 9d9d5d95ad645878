import { requirePermission, route } from "#src/server/route.ts";
import { partsImportCost } from "#src/server/take-parts-import.ts";

/** What the list would do to the cost of one kit; for those who may see money. */
export const GET = route({
  may: "change-parts",
  run: (given) => {
    requirePermission(given.role, "see-money");
    return partsImportCost(given, given.params.import ?? "");
  },
});
