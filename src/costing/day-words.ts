/** The one writer of days, in English; what a second language would replace. Day texts are ISO 8601. */

const MONTHS = [
  "January",
  "February",
  "March",
  "April",
  "May",
  "June",
  "July",
  "August",
  "September",
  "October",
  "November",
  "December",
] as const;

function partsOf(day: string) {
  const [year = "", month = "", inMonth = ""] = day.split("-");
  return {
    year: year.replace(/^0+/, ""),
    month: MONTHS[Number.parseInt(month, 10) - 1] ?? month,
    inMonth: inMonth.replace(/^0+/, ""),
  };
}

/**
 * A day with its year.
 *
 * @example dayWords("2026-11-27") === "27 November 2026"
 */
export function dayWords(day: string): string {
  const { year, month, inMonth } = partsOf(day);
  return `${inMonth} ${month} ${year}`;
}

/**
 * A day where the year is plain, as in tables.
 *
 * @example shortDayWords("2026-03-09") === "9 March"
 */
export function shortDayWords(day: string): string {
  const { month, inMonth } = partsOf(day);
  return `${inMonth} ${month}`;
}
