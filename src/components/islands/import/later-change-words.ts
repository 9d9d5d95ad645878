import type { LaterChange } from "#src/server/bring-in/later-changes.ts";

/** One thing that was changed since a list was taken, in a few words. */
export function laterChangeWords({ what, name, happened }: LaterChange): string {
  if (happened === "begun") return "a later revision of the parts list was begun";
  if (name === null) return `one ${what} it brought in was removed`;
  return `${what} ${name} was ${happened}`;
}
