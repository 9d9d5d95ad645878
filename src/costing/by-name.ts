/** The order that settles ties (section 5): by name, then by id; by code units, the same on every machine. */
export function byNameAndId(a: { name: string; id: string }, b: { name: string; id: string }): number {
  return byText(a.name, b.name) || byText(a.id, b.id);
}

/** Order of two texts by code units: below 0 when `a` comes first. */
export function byText(a: string, b: string): number {
  return a < b ? -1 : a > b ? 1 : 0;
}
