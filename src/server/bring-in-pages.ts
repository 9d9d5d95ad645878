import type { Role } from "#src/shapes/limits.ts";
import { revisionLetter } from "#src/shapes/revision-letter.ts";
import type { ListedImport } from "./bring-in/listed-imports.ts";
import { type InKit, type PartsImportView, partsImport, partsImports } from "./parts-import.ts";
import { type InWorkshop, type PriceImportView, priceImport, priceImports } from "./price-import.ts";
import { requirePermission } from "./route.ts";
import { type Sample, samplesOf } from "./samples.ts";

/** What the pages on which lists are brought in show, for those who may do it. */

interface Place {
  workshop: string;
  kit: string | null;
}

export interface BringInPage {
  place: Place;
  imports: ListedImport[];
  samples: Sample[];
}

export function partsBringInPage(given: InKit & { role: Role }): BringInPage {
  requirePermission(given.role, "change-parts");
  const place = { workshop: given.workshop.id, kit: given.kit.id };
  return { place, imports: partsImports(given), samples: samplesOf("parts-list") };
}

export function pricesBringInPage(given: InWorkshop & { role: Role }): BringInPage {
  requirePermission(given.role, "change-supply");
  const place = { workshop: given.workshop.id, kit: null };
  return { place, imports: priceImports(given), samples: samplesOf("price-list") };
}

export async function partsImportPage(
  given: InKit & { role: Role },
  id: string,
): Promise<{ place: Place; initial: PartsImportView; revision: string }> {
  requirePermission(given.role, "change-parts");
  return {
    place: { workshop: given.workshop.id, kit: given.kit.id },
    initial: await partsImport(given, id),
    revision: revisionLetter(given.kit.revision),
  };
}

export async function priceImportPage(
  given: InWorkshop & { role: Role },
  id: string,
): Promise<{ place: Place; initial: PriceImportView; revision: string }> {
  requirePermission(given.role, "change-supply");
  return {
    place: { workshop: given.workshop.id, kit: null },
    initial: await priceImport(given, id),
    revision: "",
  };
}
