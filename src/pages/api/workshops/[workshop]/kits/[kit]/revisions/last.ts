import { lastRevision } from "#src/server/revision.ts";
import { route } from "#src/server/route.ts";

/** The list as it stood when the last revision ended; nothing while the first one lasts. */
export const GET = route({ may: "see-parts", run: ({ db, kit }) => lastRevision(db, kit.id) });
