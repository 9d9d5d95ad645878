import type { PropertyName } from "#src/partslist/draft.ts";

/** A recognised property and its unit, as words. */
export const PROPERTY_WORDS: Readonly<Record<PropertyName, readonly [name: string, unit: string]>> = {
  tolerance: ["tolerance", "\u00a0%"],
  power: ["power", "\u00a0W"],
  voltage: ["voltage", "\u00a0V"],
  "hole-spacing": ["hole spacing", "\u00a0mm"],
  "row-spacing": ["row spacing", "\u00a0mm"],
  package: ["body", ""],
  dielectric: ["dielectric", ""],
  diameter: ["diameter", "\u00a0mm"],
};
