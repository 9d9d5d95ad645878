import { can } from "#src/access.ts";
import type { Role } from "#src/shapes/limits.ts";
import { revisionLetter } from "#src/shapes/revision-letter.ts";
import type { EditionRow } from "./store/edition.ts";
import type { KitRow } from "./store/kit.ts";
import type { LineRow } from "./store/line.ts";
import type { PartChoiceRow, PartRow } from "./store/part.ts";

/**
 * What leaves the server, by role. A role that may not see money gets the types without it, so that an island
 * that counts on a price does not compile for them.
 */

/** A kit as everybody sees it who may see it at all. */
export interface KitView {
  id: string;
  version: number;
  name: string;
  summary: string;
  revision: string;
  boardNeeded: boolean;
  boardShape: KitRow["boardShape"];
  boardWidth: string | null;
  boardHeight: string | null;
  closed: boolean;
}

export function presentKit(kit: KitRow): KitView {
  const { id, version, name, summary, boardNeeded, boardShape, boardWidth, boardHeight } = kit;
  const board = { boardNeeded, boardShape, boardWidth, boardHeight };
  return {
    id,
    version,
    name,
    summary,
    revision: revisionLetter(kit.revision),
    ...board,
    closed: kit.closedAt !== null,
  };
}

export interface EditionView {
  id: string;
  version: number;
  name: string;
  weight: number;
  boardsPerKit: number;
}
export interface PricedEditionView extends EditionView {
  price: string | null;
}

/** A part without what it cost. */
export type PartView = Omit<PartRow, "workshopId" | "createdAt" | "stockCost">;
export interface PricedPartView extends PartView {
  stockCost: string | null;
  /** Names of the other kits that use it: a change is a change there too. */
  alsoIn: string[];
}

export interface LineView<Part = PartView> {
  id: string;
  version: number;
  designators: string;
  mark: LineRow["mark"];
  note: string;
  /** Pieces in one kit, by edition; an edition without this line is not named. */
  quantities: Record<string, number>;
  part: Part;
}

/** How the kit buys a part; version 0 where nothing has been chosen. */
export type ChoiceView = Omit<PartChoiceRow, "workshopId" | "kitId">;

/** A parts list without money. */
export interface PlainPartsList {
  money: false;
  kit: KitView;
  editions: EditionView[];
  lines: LineView[];
}
/** A parts list for those who may see money. */
export interface PricedPartsList {
  money: true;
  kit: KitView;
  editions: PricedEditionView[];
  lines: LineView<PricedPartView>[];
  choices: ChoiceView[];
}
export type PartsList = PlainPartsList | PricedPartsList;

/** A list as it lies in the store. */
export interface StoredPartsList {
  kit: KitRow;
  editions: EditionRow[];
  lines: { line: LineRow; part: PartRow; quantities: Record<string, number> }[];
  choices: PartChoiceRow[];
  alsoIn: Map<string, string[]>;
}

function presentEdition({ id, version, name, weight, boardsPerKit }: EditionRow): EditionView {
  return { id, version, name, weight, boardsPerKit };
}

/** Named one by one, so that a column added later leaves the server only when somebody writes it here. */
function presentPart(row: PartRow): PartView {
  const { id, version, class: kind, name, spec, value, unit, tolerance, power, voltage } = row;
  const { holeSpacing, manufacturer, manufacturerPartNumber, datasheet, drawer, note, freeStock } = row;
  return {
    ...{ id, version, class: kind, name, spec, value, unit, tolerance, power, voltage },
    ...{ package: row.package, holeSpacing, manufacturer, manufacturerPartNumber },
    ...{ datasheet, drawer, note, freeStock },
  };
}

function presentLine<Part>(
  { line, quantities }: StoredPartsList["lines"][number],
  part: Part,
): LineView<Part> {
  const { id, version, designators, mark, note } = line;
  return { id, version, designators, mark, note, quantities, part };
}

function presentPricedEdition(row: EditionRow): PricedEditionView {
  return { ...presentEdition(row), price: row.price };
}

/** The editions of a kit as a role may see them. */
export function presentEditions(editions: EditionRow[], role: Role): EditionView[] | PricedEditionView[] {
  return editions.map(can(role, "see-money") ? presentPricedEdition : presentEdition);
}

function presentChoice({ workshopId, kitId, ...choice }: PartChoiceRow): ChoiceView {
  return choice;
}

/** A parts list without money: for everybody who may see the kit. */
export function plainPartsList(stored: StoredPartsList): PlainPartsList {
  return {
    money: false,
    kit: presentKit(stored.kit),
    editions: stored.editions.map(presentEdition),
    lines: stored.lines.map((row) => presentLine(row, presentPart(row.part))),
  };
}

/** A parts list with what its parts cost: only for those who may see money. */
export function pricedPartsList(stored: StoredPartsList): PricedPartsList {
  const pricedPart = (row: PartRow): PricedPartView => ({
    ...presentPart(row),
    stockCost: row.stockCost,
    alsoIn: stored.alsoIn.get(row.id) ?? [],
  });
  return {
    money: true,
    kit: presentKit(stored.kit),
    editions: stored.editions.map(presentPricedEdition),
    lines: stored.lines.map((row) => presentLine(row, pricedPart(row.part))),
    choices: stored.choices.map(presentChoice),
  };
}

/** A parts list as a role may see it. */
export function presentPartsList(stored: StoredPartsList, role: Role): PartsList {
  return can(role, "see-money") ? pricedPartsList(stored) : plainPartsList(stored);
}
