import { boards } from "#src/server/board-changes.ts";
import { route } from "#src/server/route.ts";

/** The quotes for the kit's board and how it orders them; what is chosen is changed with the run. */
export const GET = route({ may: "see-money", run: boards });
