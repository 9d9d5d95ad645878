import type { Db } from "#db/client.ts";
import { workshopsOf } from "./store/membership.ts";
import type { UserRow } from "./store/session.ts";

/** Where somebody lands who signs in: in the workshop they were in last, else the first by name, else a new one. */
export function landingPath(db: Db, user: UserRow): string {
  const all = workshopsOf(db, user.id).map(({ workshop }) => workshop.id);
  const id = all.find((one) => one === user.lastWorkshopId) ?? all[0];
  return id === undefined ? "/workshops/new" : `/workshops/${id}`;
}
