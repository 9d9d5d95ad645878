/** Whose lists are brought in: a kit's parts lists, or (no kit) the price lists of a workshop. */
export interface ImportPlace {
  workshop: string;
  kit: string | null;
}

/** `/api/workshops/w/kits/k/imports` + rest, for calls. */
export function importsApi({ workshop, kit }: ImportPlace, rest = ""): string {
  const base = `/api/workshops/${workshop}`;
  return kit === null ? `${base}/imports${rest}` : `${base}/kits/${kit}/imports${rest}`;
}

/** The page where lists are brought in, or below it the page of one list. */
export function importsPath({ workshop, kit }: ImportPlace, rest = ""): string {
  const base = `/workshops/${workshop}`;
  return kit === null ? `${base}/suppliers/bring-in${rest}` : `${base}/kits/${kit}/parts/bring-in${rest}`;
}

/** Where one goes when a list has been brought in. */
export function homePath({ workshop, kit }: ImportPlace): string {
  return kit === null ? `/workshops/${workshop}/suppliers` : `/workshops/${workshop}/kits/${kit}/parts`;
}

/** Keys of the shared query cache. */
export const importKeys = {
  list: ({ workshop, kit }: ImportPlace) => ["imports", kit ?? workshop] as const,
  one: (id: string) => ["import", id] as const,
  cost: (id: string, version: number) => ["import", id, "cost", version] as const,
};
