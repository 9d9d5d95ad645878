import type { Db } from "#db/client.ts";
import type { Role } from "#src/shapes/limits.ts";
import { linesOf } from "./store/line.ts";
import { visibleKits } from "./visible-kits.ts";

/** A kit of the workshop that has a list and can be looked at, or copied, by somebody who begins one. */
export function exampleKit(
  db: Db,
  workshopId: string,
  role: Role,
  userId: string,
): { id: string; name: string } | null {
  const found = visibleKits(db, workshopId, role, userId).find(({ id }) => linesOf(db, id).length > 0);
  return found ? { id: found.id, name: found.name } : null;
}
