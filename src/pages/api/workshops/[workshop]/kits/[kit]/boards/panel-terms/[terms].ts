import { changeTerms, removeTerms } from "#src/server/panel-terms-changes.ts";
import { route } from "#src/server/route.ts";
import { RemovalQuery } from "#src/shapes/field.ts";
import { PanelTermsChange } from "#src/shapes/panel-terms.ts";

/** Changes panel terms. */
export const PATCH = route({
  may: "change-supply",
  input: PanelTermsChange,
  run: (given) => changeTerms(given, given.params.terms ?? "", given.input),
});

/** Removes panel terms; quotes stay. */
export const DELETE = route({
  may: "change-supply",
  query: RemovalQuery,
  run: (given) => removeTerms(given, given.params.terms ?? "", given.query.version),
});
