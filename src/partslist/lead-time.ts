const WEEKS = /week|woche|semaine|semana|settiman|we(?:ek|ken)|tydzie|tygod|týd|veck|недел|週|周|wk/i;
const DAYS_IN_A_WEEK = 7;

/**
 * A lead time in days: "5 days", "2-3 Wochen" (the longer), "10". Weeks count seven days. `inWeeks` for a
 * column headed in weeks. `null` where no number stands ("on request").
 */
export function readLeadTime(cell: string, inWeeks = false): number | null {
  const numbers = [...cell.matchAll(/\d{1,4}/g)].map((found) => Number(found[0]));
  const last = numbers.at(-1);
  if (last === undefined) return null;
  const days = inWeeks || WEEKS.test(cell) ? last * DAYS_IN_A_WEEK : last;
  return days > 3650 ? null : days;
}
