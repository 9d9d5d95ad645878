/** How days and spans of days are written. Days are ISO 8601 text, reckoned in UTC. */

const DAY_MS = 24 * 60 * 60 * 1000;

function whole(day: string): Date {
  return new Date(`${day}T00:00:00Z`);
}

/** "9 March 2026". */
export function dayText(day: string): string {
  return whole(day).toLocaleDateString("en-GB", {
    day: "numeric",
    month: "long",
    year: "numeric",
    timeZone: "UTC",
  });
}

/** "9 March", in tables. */
export function shortDayText(day: string): string {
  return whole(day).toLocaleDateString("en-GB", { day: "numeric", month: "long", timeZone: "UTC" });
}

/** Whole days from one day to another; negative where the other is earlier. */
export function daysBetween(from: string, to: string): number {
  return Math.round((whole(to).getTime() - whole(from).getTime()) / DAY_MS);
}

/** The day so many days later. */
export function dayAfter(day: string, days: number): string {
  return new Date(whole(day).getTime() + days * DAY_MS).toISOString().slice(0, 10);
}

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
