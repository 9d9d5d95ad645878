import { daysBetween } from "#src/costing/calendar/days.ts";

/** How spans of days are written; days themselves are written by `day-words.ts` of the reckoning. */

/** How old a price is: "today", "2 days old", "5 weeks old". */
export function ageText(day: string, today: string): string {
  const age = daysBetween(day, today);
  if (age <= 0) return "today";
  return `${spanText(age)} old`;
}

/** A lead time: days up to 20, then weeks. */
export function spanText(days: number): string {
  if (days === 1) return "1 day";
  if (days <= 20) return `${days} days`;
  const weeks = Math.round(days / 7);
  return `${weeks} weeks`;
}
