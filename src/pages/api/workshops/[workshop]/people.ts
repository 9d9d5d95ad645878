import { workshopPeople } from "#src/server/people.ts";
import { route } from "#src/server/route.ts";

/** The people of a workshop with their roles. */
export const GET = route({ may: "manage-workshop", run: workshopPeople });
