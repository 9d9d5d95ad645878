import type { Db } from "#db/client.ts";
import { newId } from "./new-id.ts";
import { type ActivityRow, recordActivity } from "./store/activity.ts";

/** Writes down who changed what, in the same transaction as the change; the entry gets its id here. */
export function logActivity(db: Db, entry: Omit<ActivityRow, "id">): void {
  recordActivity(db, { id: newId(), ...entry });
}
