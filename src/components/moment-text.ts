/** Which part of a moment is written: the day, or the day and the time. */
export type MomentPart = "day" | "time";

/**
 * "9 March 2026", or "9 March 2026, 14:32", from milliseconds since 1970, in a time zone; without one in the reader's
 * own, as their browser has it.
 */
export function momentText(at: number, part: MomentPart, timeZone?: string): string {
  const day = new Intl.DateTimeFormat("en-GB", { day: "numeric", month: "long", year: "numeric", timeZone });
  if (part === "day") return day.format(at);
  const time = new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit", timeZone });
  return `${day.format(at)}, ${time.format(at)}`;
}
