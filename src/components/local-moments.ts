import { type MomentPart, momentText } from "./moment-text.ts";

/** Writes every moment of a page anew in the time zone of this browser. */
export function showLocalMoments(page: Document, timeZone?: string): void {
  for (const moment of page.querySelectorAll<HTMLTimeElement>("time[data-moment]"))
    moment.textContent = momentText(
      Date.parse(moment.dateTime),
      moment.dataset.moment as MomentPart,
      timeZone,
    );
}
