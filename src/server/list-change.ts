import type { Db } from "#db/client.ts";
import { compareLists, type ListChange } from "#src/partslist/since-revision.ts";
import { partsListOf } from "./parts-list.ts";
import { type LineView, plainPartsList } from "./present.ts";
import { type EndedRevision, lastRevision } from "./revision.ts";
import type { KitRow } from "./store/kit.ts";

type Compared = LineView | EndedRevision["lines"][number];

/** What has changed in a parts list since its last revision ended; without money, so that every role may see it. */
export interface ChangeSince extends ListChange<Compared> {
  since: EndedRevision;
  /** Names of the editions, of now and of then, by id. */
  editions: Map<string, string>;
}

/** Compares a kit's list with its last revision; `null` while the first one lasts. */
export function listChange(db: Db, kit: KitRow): ChangeSince | null {
  const since = lastRevision(db, kit.id);
  if (!since) return null;
  const list = plainPartsList(partsListOf(db, kit));
  const editions = new Map([...since.editions, ...list.editions].map(({ id, name }) => [id, name]));
  return { since, editions, ...compareLists<Compared>(since.lines, list.lines) };
}
