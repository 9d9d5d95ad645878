import { rates } from "#src/server/currency-rate-changes.ts";
import { route } from "#src/server/route.ts";

/** The rates of the workshop, by currency. */
export const GET = route({ may: "see-money", run: rates });
