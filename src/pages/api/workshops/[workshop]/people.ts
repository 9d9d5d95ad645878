import { workshopPeople } from "#src/server/people.ts";
import { route } from "#src/server/route.ts";

export const GET = route({ may: "manage-workshop", run: workshopPeople });
