import type { PartEntry } from "#src/shapes/part.ts";
import type { PartsChange } from "#src/shapes/parts-change.ts";
import { newId } from "./new-id.ts";
import { type Changing as ChangingSomewhere, noteChange } from "./note-change.ts";
import { wrongField } from "./problem.ts";
import type { KitRow } from "./store/kit.ts";
import type { WorkshopRow } from "./store/membership.ts";
import { addParts, type NewPart, type PartRow, partOf, partsOf } from "./store/part.ts";

export type ChangingParts = ChangingSomewhere & { workshop: WorkshopRow; kit: KitRow };

/** What a change to a parts list carries from step to step. */
export interface PartsBatch {
  given: ChangingParts;
  /** Ids of the kit's editions. */
  editions: ReadonlySet<string>;
  /** Line ids in the order of the list, as the steps so far leave it. */
  order: string[];
  lines: Set<string>;
  parts: Set<string>;
  removed: string[];
  /** The workshop's parts by what they read; looked up once, when a step first asks. */
  known: Map<string, PartRow> | null;
}

/** Takes one kind of step. @throws Problem with paths inside the step. */
export type TakeStep<Do extends PartsChange["do"]> = (
  batch: PartsBatch,
  step: Extract<PartsChange, { do: Do }>,
) => void;

const BLANK_PART = {
  spec: "",
  value: null,
  unit: null,
  tolerance: null,
  power: null,
  voltage: null,
  package: "",
  holeSpacing: null,
  manufacturer: "",
  manufacturerPartNumber: "",
  datasheet: "",
  drawer: "",
  note: "",
  freeStock: 0,
  stockCost: null,
} as const;

/** A part of the workshop that a step names. */
export function foundPart({ given }: PartsBatch, id: string): PartRow {
  const part = partOf(given.db, given.workshop.id, id);
  if (!part) throw wrongField("part", "This part is not in the workshop.");
  return part;
}

/** Makes a part of what is said of it; what is not said is empty. */
export function addPart({ given, known }: PartsBatch, entry: PartEntry | NewPart): PartRow {
  const row = { ...BLANK_PART, ...entry, id: newId(), workshopId: given.workshop.id, createdAt: given.now };
  addParts(given.db, [{ ...row, version: 1 }]);
  const part = partOf(given.db, given.workshop.id, row.id) as PartRow;
  known?.set(readsAs(part), part);
  noteChange(given, { action: "part.add", subjectId: part.id, subjectName: part.name });
  return part;
}

/** Two parts are one and the same where people read the same on their bags. */
function readsAs({ class: kind, name, spec, package: body, manufacturerPartNumber }: PartIdentity): string {
  return JSON.stringify([kind, name, spec, body, manufacturerPartNumber]);
}
type PartIdentity = Pick<PartRow, "class" | "name" | "spec" | "package" | "manufacturerPartNumber">;

/** The workshop's part that reads the same, if there is one, so that nobody buys it twice. */
export function samePart(batch: PartsBatch, like: PartIdentity): PartRow | undefined {
  const { db, workshop } = batch.given;
  // Of several that read the same the oldest one counts.
  batch.known ??= new Map(
    partsOf(db, workshop.id)
      .reverse()
      .map((part) => [readsAs(part), part]),
  );
  return batch.known.get(readsAs(like));
}

/** The part of a new line: one of the workshop's, by id or because it reads the same, or a new one. */
export function partForLine(batch: PartsBatch, part: string | PartEntry): PartRow {
  if (typeof part === "string") return foundPart(batch, part);
  return samePart(batch, { ...BLANK_PART, ...part }) ?? addPart(batch, part);
}
