import type { Changing } from "../note-change.ts";
import type { KitRow } from "../store/kit.ts";
import { linesOf } from "../store/line.ts";
import { offersOf } from "../store/offer.ts";
import { partsOf } from "../store/part.ts";
import type { Before } from "./ledger.ts";

/** Something a list brought in that is not as it left it. */
export interface LaterChange {
  what: "line" | "part" | "offer" | "revision";
  /** What it is called now; `null` where it is gone and nobody remembers. */
  name: string | null;
  happened: "changed" | "removed" | "begun";
}

type Named = Map<string, { name: string; version: number }>;

function differing(what: LaterChange["what"], left: Record<string, number>, now: Named): LaterChange[] {
  return Object.entries(left).flatMap(([id, version]): LaterChange[] => {
    const row = now.get(id);
    if (!row) return [{ what, name: null, happened: "removed" }];
    return row.version === version ? [] : [{ what, name: row.name, happened: "changed" }];
  });
}

/**
 * What was changed since a list was taken, of what it touched. A supplier it added may have been given its terms
 * since: taking the list back leaves such a supplier alone, so that is no clash.
 */
export function laterChanges({ db, workshop }: Changing, kit: KitRow | null, before: Before): LaterChange[] {
  const lines = kit === null ? [] : linesOf(db, kit.id);
  const named: Record<"line" | "part" | "offer", Named> = {
    line: new Map(
      lines.map(({ line, part }) => [
        line.id,
        { name: line.designators || part.name, version: line.version },
      ]),
    ),
    part: new Map(partsOf(db, workshop.id).map((row) => [row.id, row])),
    offer: new Map(
      offersOf(db, workshop.id).map(({ offer }) => [
        offer.id,
        { name: offer.orderCode || offer.id, version: offer.version },
      ]),
    ),
  };
  const begun = before.revision !== null && kit !== null && kit.revision !== before.revision.number + 1;
  return [
    ...(begun ? [{ what: "revision", name: null, happened: "begun" } as const] : []),
    ...differing("line", before.left.lines, named.line),
    ...differing("part", before.left.parts, named.part),
    ...differing("offer", before.left.offers, named.offer),
  ];
}
