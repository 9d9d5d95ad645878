import type { Db } from "#db/client.ts";
import { can } from "#src/access.ts";
import type { Role } from "#src/shapes/limits.ts";
import { type ActivityEntry, activitySince } from "./store/activity.ts";

const DAY = 24 * 60 * 60 * 1000;
const READ_MOST = 400;
const NEWS_MOST = 8;

/** What somebody did, with how often they did the same in the same kit; the rest is of the last time. */
export interface NewsEntry extends ActivityEntry {
  count: number;
}

/** What only those read who manage people and settings; somebody who comes or goes is everybody's news. */
const MANAGED = /^(person\.(role|kits|remove)|invitation\.|workshop\.)/;
/** What somebody reads who sees no money: lists, not prices, offers or runs. */
const OF_LISTS =
  /^(line\.|revision\.|kit\.(add|change|copy|close|open)|edition\.(add|remove|order)|person\.(join|leave))/;
/** What a person did for themselves alone. */
const OWN = /^access-token\./;

function mayRead(role: Role, { action, kitId }: ActivityEntry): boolean {
  if (OWN.test(action)) return false;
  if (MANAGED.test(action)) return can(role, "manage-workshop");
  if (can(role, "see-money")) return true;
  return OF_LISTS.test(action) || (action.startsWith("list.") && kitId !== null);
}

/**
 * What other people of the workshop did since yesterday that this role may know of, the newest first; what
 * somebody did several times in the same kit is one entry. `kitIds` are the kits the person sees.
 */
export function newsFor(
  db: Db,
  { workshopId, role, userId, kitIds }: { workshopId: string; role: Role; userId: string; kitIds: string[] },
  now: number,
): NewsEntry[] {
  const together = new Map<string, NewsEntry>();
  for (const entry of activitySince(db, workshopId, now - DAY, kitIds, READ_MOST)) {
    if (entry.userId === userId || !mayRead(role, entry)) continue;
    const key = [entry.userId, entry.action, entry.kitId, keyOf(entry)].join(" ");
    const known = together.get(key);
    if (known) known.count += 1;
    else together.set(key, { ...entry, count: 1 });
  }
  return [...together.values()].slice(0, NEWS_MOST);
}

/** A price or a run that was set several times is told once, as it now stands; things of a kind are counted. */
function keyOf({ action, subjectId }: ActivityEntry): string {
  return /^(edition|run|kit|supplier|rate|person|list)\./.test(action) ? subjectId : "";
}
