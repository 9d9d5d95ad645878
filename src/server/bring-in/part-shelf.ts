import type { Db } from "#db/client.ts";
import { canBeSamePart, type PartFields, partKey } from "#src/partslist/part-fields.ts";
import { type PartRow, partsOf } from "#src/server/store/part.ts";

/** The parts of a workshop, looked up by what tells them apart; kept up to date while a list is taken. */
export interface PartShelf {
  byId(id: string): PartRow | undefined;
  /** The part that is the same as this one, if the workshop has it. */
  find(said: PartFields): PartRow | undefined;
  put(part: PartRow): void;
}

function numberKey(part: PartFields): string {
  return part.manufacturerPartNumber.toLowerCase().replace(/\s+/g, "");
}

function add(index: Map<string, PartRow[]>, key: string, part: PartRow): void {
  const rows = index.get(key);
  if (rows) rows.push(part);
  else index.set(key, [part]);
}

function withoutNumber(part: PartFields): PartFields {
  return { ...part, manufacturerPartNumber: "", manufacturer: "" };
}

/**
 * Opens a workshop's parts for looking up. A part is the same where its manufacturer's number is and nothing else
 * contradicts; without a number, where all that tells parts apart is equal, or where one part alone differs by
 * nothing but its number.
 */
export function partShelf(db: Db, workshopId: string): PartShelf {
  const rows = new Map<string, PartRow>();
  const [byKey, byNumber, byRest] = [new Map(), new Map(), new Map()] as Map<string, PartRow[]>[] as [
    Map<string, PartRow[]>,
    Map<string, PartRow[]>,
    Map<string, PartRow[]>,
  ];
  const current = (found: PartRow[] | undefined, fits: (part: PartRow) => boolean) =>
    (found ?? [])
      .map((part) => rows.get(part.id))
      .filter((part) => part !== undefined && fits(part)) as PartRow[];

  function put(part: PartRow): void {
    rows.set(part.id, part);
    add(byKey, partKey(part), part);
    if (part.manufacturerPartNumber !== "") add(byNumber, numberKey(part), part);
    add(byRest, partKey(withoutNumber(part)), part);
  }

  function find(said: PartFields): PartRow | undefined {
    const key = partKey(said);
    const exact = current(byKey.get(key), (part) => partKey(part) === key)[0];
    if (exact) return exact;
    if (said.manufacturerPartNumber !== "")
      return current(
        byNumber.get(numberKey(said)),
        (part) => numberKey(part) === numberKey(said) && canBeSamePart(part, said),
      )[0];
    const rest = current(byRest.get(partKey(withoutNumber(said))), (part) => canBeSamePart(part, said));
    const one = new Map(rest.map((part) => [part.id, part]));
    return one.size === 1 ? rest[0] : undefined;
  }

  for (const part of partsOf(db, workshopId)) put(part);
  return { byId: (id) => rows.get(id), find, put };
}
