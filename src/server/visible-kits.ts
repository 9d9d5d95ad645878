import type { Db } from "#db/client.ts";
import { seesEveryKit } from "#src/access.ts";
import type { Role } from "#src/shapes/limits.ts";
import { type KitRow, kitsForGuest, kitsOf } from "./store/kit.ts";

/** The kits of a workshop that a person may see, the oldest first. */
export function visibleKits(db: Db, workshopId: string, role: Role, userId: string): KitRow[] {
  return seesEveryKit(role) ? kitsOf(db, workshopId) : kitsForGuest(db, workshopId, userId);
}
